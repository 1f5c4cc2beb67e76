import { formatNumber } from '@/lib/format';
import type { DosingPoint } from '@/lib/plants/schema';
import type { LineStep } from '@/lib/today/schema';
import { Figure } from '@/components/ui/figure';
import { StationReadings } from './station-readings';
import { StepGlyph } from './step-glyph';

/** One step: four rows of the line's grid on wide screens, one block beside a vertical line on narrow ones. */
export function PlantLineStep({
  step,
  isFirst,
  isLast,
  organisationSlug,
  plantSlug,
  timeZone,
  now,
}: {
  step: LineStep;
  isFirst: boolean;
  isLast: boolean;
  organisationSlug: string;
  plantSlug: string;
  timeZone: string;
  now: Date;
}) {
  return (
    <li className="relative grid grid-cols-[3.5rem_1fr] gap-x-3 pb-5 xl:row-span-4 xl:grid-cols-1 xl:grid-rows-subgrid xl:gap-x-0 xl:pb-0">
      <ul className="order-2 col-start-2 flex flex-wrap gap-x-6 gap-y-1 xl:order-none xl:col-start-1 xl:flex-col xl:justify-end xl:gap-2 xl:pr-3">
        {step.dosing.map((point) => (
          <Dosing key={point.id} point={point} />
        ))}
      </ul>
      <div className="row-span-3 row-start-1 flex flex-col items-center xl:row-span-1 xl:row-start-2 xl:block">
        <span className="xl:ml-1 xl:block xl:h-10">
          <StepGlyph kind={step.kind} />
        </span>
        <Water
          hasDosing={step.dosing.length > 0}
          hasTap={step.station !== null}
          isFirst={isFirst}
          isLast={isLast}
        />
      </div>
      <h3 className="order-1 col-start-2 pt-1.5 pb-1 text-base xl:order-none xl:col-start-1 xl:row-start-3 xl:pr-3">
        {step.name}
      </h3>
      {step.station === null ? null : (
        <div className="order-3 col-start-2 xl:order-none xl:col-start-1 xl:row-start-4 xl:pr-4">
          <StationReadings
            station={step.station}
            organisationSlug={organisationSlug}
            plantSlug={plantSlug}
            timeZone={timeZone}
            now={now}
          />
        </div>
      )}
    </li>
  );
}

function Dosing({ point }: { point: DosingPoint }) {
  return (
    <li className="text-sm leading-snug">
      <span className="block">{point.productName}</span>
      {point.doseMgPerL === null ? (
        <span className="text-ink-soft">not set</span>
      ) : (
        <>
          <Figure unit="mg/L" className="font-semibold">
            {formatNumber(point.doseMgPerL, point.doseMgPerL < 1 ? 2 : 1)}
          </Figure>{' '}
          <span className="unit">{point.doseBasis}</span>
        </>
      )}
    </li>
  );
}

/** The stretch of water itself, with a drop where something is fed and a tap where it is sampled. */
function Water({
  hasDosing,
  hasTap,
  isFirst,
  isLast,
}: {
  hasDosing: boolean;
  hasTap: boolean;
  isFirst: boolean;
  isLast: boolean;
}) {
  return (
    <span
      aria-hidden="true"
      className="relative mt-1 block w-1.5 grow bg-verdigris xl:h-1.5 xl:w-full"
    >
      {hasDosing ? (
        <svg
          viewBox="0 0 12 18"
          className="absolute -top-1 -left-5 hidden h-4.5 w-3 fill-chalk-sheet stroke-ink xl:top-auto xl:bottom-1.5 xl:left-18 xl:block"
          strokeWidth="1.5"
        >
          <path d="M6 1c3 5 5 7.500 5 10.500a5 5 0 0 1-10 0C1 8.500 3 6 6 1z" />
        </svg>
      ) : null}
      {hasTap ? (
        <span className="absolute top-0 -left-[5px] size-4 rounded-full border-[3px] border-verdigris bg-chalk-sheet xl:-top-[5px] xl:left-7" />
      ) : null}
      {isFirst ? (
        <span className="absolute -top-1 -left-[3px] h-1 w-3 bg-verdigris xl:-top-[3px] xl:left-0 xl:h-3 xl:w-1" />
      ) : null}
      {isLast ? (
        <span className="absolute right-0 hidden size-0 border-y-8 border-l-12 border-y-transparent border-l-verdigris xl:-top-[5px] xl:-right-1 xl:block" />
      ) : null}
    </span>
  );
}
