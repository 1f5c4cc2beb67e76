import { PlantLineStep } from './plant-line-step';
import type { LineStep } from '@/lib/today/schema';

/**
 * The plant drawn as its own line of water: dosing above, the steps along the line, what was measured hanging below.
 * Wide screens read it left to right, narrow ones top to bottom; the markup is one ordered list either way.
 */
export function PlantLine({
  steps,
  organisationSlug,
  plantSlug,
  timeZone,
  now,
  maySample,
}: {
  steps: readonly LineStep[];
  organisationSlug: string;
  plantSlug: string;
  timeZone: string;
  now: Date;
  maySample: boolean;
}) {
  const columns = steps
    .map(({ station }) => (station === null ? 'minmax(7.25rem, 0.8fr)' : 'minmax(9.5rem, 1.3fr)'))
    .join(' ');
  return (
    <ol
      aria-label="The line of water, from source to network"
      style={{ '--line-columns': columns } as React.CSSProperties}
      className="xl:grid xl:grid-cols-[var(--line-columns)] xl:grid-rows-[auto_auto_auto_auto]"
    >
      {steps.map((step, index) => (
        <PlantLineStep
          key={step.id}
          step={step}
          isFirst={index === 0}
          isLast={index === steps.length - 1}
          organisationSlug={organisationSlug}
          plantSlug={plantSlug}
          timeZone={timeZone}
          now={now}
          maySample={maySample}
        />
      ))}
    </ol>
  );
}
