'use client';

import {
  CategoryScale,
  Chart,
  LinearScale,
  LineController,
  LineElement,
  PointElement,
  TimeScale,
  Tooltip,
  type ChartData,
  type ChartOptions,
} from 'chart.js';
import annotationPlugin from 'chartjs-plugin-annotation';
import { TZDate } from '@date-fns/tz';
import 'chartjs-adapter-date-fns';
import { useMemo } from 'react';
import { Line } from 'react-chartjs-2';
import { formatNumber } from '@/lib/format';
import type { ChartPalette } from './chart-palette';
import { targetAnnotations, type TargetBand } from './target-annotations';
import { usePalette } from './use-palette';

Chart.register(
  LineController,
  LineElement,
  PointElement,
  LinearScale,
  CategoryScale,
  TimeScale,
  Tooltip,
  annotationPlugin,
);

export interface ChartPoint {
  readonly at: string;
  readonly value: number;
  readonly isBelowLimit: boolean;
  readonly isMissed: boolean;
}

interface Drawn {
  x: number;
  y: number | null;
}

/** One quantity over time: a thin ink line on ruled paper, its target as a band, gaps left open. */
export default function TrendChart({
  points,
  target,
  gapMs,
  from,
  to,
  decimals,
  unit,
  timeZone,
  label,
}: {
  points: readonly ChartPoint[];
  target: TargetBand | null;
  gapMs: number;
  from: number;
  to: number;
  decimals: number;
  unit: string;
  timeZone: string;
  /** What a reader who cannot see the drawing is told. */
  label: string;
}) {
  const palette = usePalette();
  const data = useMemo(() => chartData(points, gapMs, palette), [points, gapMs, palette]);
  const isNeverNegative = points.every(({ value }) => value >= 0) && (target?.lowest ?? 0) >= 0;
  const options = useMemo(
    () => chartOptions({ palette, target, from, to, decimals, unit, timeZone, isNeverNegative }),
    [palette, target, from, to, decimals, unit, timeZone, isNeverNegative],
  );
  return (
    <div className="relative h-56 w-full">
      <Line data={data} options={options} role="img" aria-label={label} />
    </div>
  );
}

/** A line with a null where a gap is, and the points that need a mark of their own. */
function chartData(
  points: readonly ChartPoint[],
  gapMs: number,
  palette: ChartPalette,
): ChartData<'line', Drawn[]> {
  const line: Drawn[] = [];
  let last: number | undefined;
  for (const { at, value } of points) {
    const x = Date.parse(at);
    if (last !== undefined && x - last > gapMs) line.push({ x: last + 1, y: null });
    line.push({ x, y: value });
    last = x;
  }
  const marked = (test: (point: ChartPoint) => boolean): Drawn[] =>
    points.filter(test).map(({ at, value }) => ({ x: Date.parse(at), y: value }));
  const dense = points.length > 120;
  return {
    datasets: [
      {
        label: 'measured',
        data: line,
        borderColor: palette.ink,
        borderWidth: 1.25,
        pointRadius: dense ? 0 : 2,
        pointBackgroundColor: palette.ink,
        pointHitRadius: 8,
        order: 3,
      },
      {
        label: 'below the reporting limit',
        data: marked(({ isBelowLimit }) => isBelowLimit),
        showLine: false,
        pointStyle: 'triangle',
        pointRotation: 180,
        pointRadius: 4,
        pointBackgroundColor: palette.sheet,
        pointBorderColor: palette.ink,
        pointBorderWidth: 1.5,
        order: 2,
      },
      {
        label: 'out of target',
        data: marked(({ isMissed }) => isMissed),
        showLine: false,
        pointStyle: 'rectRot',
        pointRadius: 4.5,
        pointBackgroundColor: palette.rust,
        pointBorderColor: palette.sheet,
        pointBorderWidth: 1,
        order: 1,
      },
    ],
  };
}

function chartOptions({
  palette,
  target,
  from,
  to,
  decimals,
  unit,
  timeZone,
  isNeverNegative,
}: {
  palette: ChartPalette;
  target: TargetBand | null;
  from: number;
  to: number;
  decimals: number;
  unit: string;
  timeZone: string;
  isNeverNegative: boolean;
}): ChartOptions<'line'> {
  const figures = { family: palette.figureFont, size: 13 };
  const suggested = [target?.lowest, target?.highest].filter(
    (bound): bound is number => bound !== null && bound !== undefined,
  );
  return {
    animation: false,
    maintainAspectRatio: false,
    parsing: false,
    normalized: true,
    interaction: { mode: 'nearest', axis: 'x', intersect: false },
    scales: {
      x: {
        type: 'time',
        min: from,
        max: to,
        time: {
          tooltipFormat: 'd MMM yyyy, HH:mm',
          displayFormats: { day: 'd MMM', week: 'd MMM', month: 'MMM yyyy', quarter: 'MMM yyyy' },
        },
        adapters: { date: { in: (value: number) => new TZDate(value, timeZone) } },
        grid: { color: palette.rule, tickColor: palette.strong },
        border: { color: palette.strong },
        ticks: { color: palette.soft, font: figures, maxRotation: 0, autoSkipPadding: 24 },
      },
      y: {
        ...(suggested.length === 0
          ? {}
          : { suggestedMin: Math.min(...suggested), suggestedMax: Math.max(...suggested) }),
        grace: '6%',
        // The room left around the line never suggests a negative amount of what cannot be negative.
        afterDataLimits: (axis) => {
          if (axis.min < 0 && isNeverNegative) axis.min = 0;
        },
        // One width for every panel, so that their time axes stand above one another.
        afterFit: (axis) => {
          axis.width = 64;
        },
        grid: { color: palette.rule, tickColor: palette.strong },
        border: { color: palette.strong },
        ticks: {
          color: palette.soft,
          font: figures,
          maxTicksLimit: 6,
          callback: (value) => formatNumber(Number(value), decimals),
        },
      },
    },
    plugins: {
      annotation: { annotations: targetAnnotations(target, palette, decimals) },
      tooltip: {
        filter: ({ datasetIndex }) => datasetIndex === 0,
        displayColors: false,
        backgroundColor: palette.ink,
        titleColor: palette.sheet,
        bodyColor: palette.sheet,
        cornerRadius: 0,
        titleFont: { family: palette.textFont, size: 13 },
        bodyFont: { family: palette.figureFont, size: 14 },
        callbacks: {
          label: ({ parsed }) =>
            parsed.y === null ? '' : `${formatNumber(parsed.y, decimals)} ${unit}`.trim(),
        },
      },
    },
  };
}
