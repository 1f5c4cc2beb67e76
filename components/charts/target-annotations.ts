import type { AnnotationOptions } from 'chartjs-plugin-annotation';
import { formatNumber } from '@/lib/format';
import type { ChartPalette } from './chart-palette';

export interface TargetBand {
  readonly lowest: number | null;
  readonly highest: number | null;
}

/** The target as a washed band with its limits in words at the right edge. */
export function targetAnnotations(
  target: TargetBand | null,
  palette: ChartPalette,
  decimals: number,
): Record<string, AnnotationOptions> {
  if (target === null) return {};
  const { lowest, highest } = target;
  const limit = (value: number, word: string, position: 'start' | 'end'): AnnotationOptions => ({
    type: 'line',
    yMin: value,
    yMax: value,
    borderColor: palette.verdigris,
    borderWidth: 1.25,
    borderDash: [6, 4],
    drawTime: 'beforeDatasetsDraw',
    label: {
      display: true,
      content: `${word} ${formatNumber(value, decimals)}`,
      position: 'end',
      yAdjust: position === 'start' ? 9 : -9,
      color: palette.verdigris,
      backgroundColor: 'transparent',
      font: { family: palette.textFont, size: 12, weight: 'normal' },
      padding: 2,
    },
  });
  return {
    band: {
      type: 'box',
      ...(lowest === null ? {} : { yMin: lowest }),
      ...(highest === null ? {} : { yMax: highest }),
      backgroundColor: palette.wash,
      borderWidth: 0,
      drawTime: 'beforeDraw',
    },
    ...(lowest === null ? {} : { lowest: limit(lowest, 'lowest', 'start') }),
    ...(highest === null ? {} : { highest: limit(highest, 'highest', 'end') }),
  };
}
