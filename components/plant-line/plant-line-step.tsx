import { formatFormula, formatNumber } from '@/lib/format';
import type { DosingPoint } from '@/lib/plants/schema';
import type { LineStep } from '@/lib/today/schema';
import { Figure } from '@/components/ui/figure';
import { Formula } from '@/components/ui/formula';
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
  maySample,
}: {
  step: LineStep;
  isFirst: boolean;
  isLast: boolean;
  organisationSlug: string;
  plantSlug: string;
  timeZone: string;
  now: Date;
  maySample: boolean;
}) {
  return (
    <li className="relative grid grid-cols-[3.5rem_1fr] gap-x-4 pb-6 last:pb-0 xl:row-span-4 xl:grid-cols-1 xl:grid-rows-subgrid xl:gap-x-0 xl:pb-0">
      <ul
        className={`order-2 col-start-2 flex flex-wrap gap-x-6 gap-y-1 xl:order-none xl:col-start-1 xl:flex-col xl:justify-end xl:gap-2 xl:pr-3 ${
          step.dosing.length === 0
            ? ''
            : 'mb-2 xl:mb-0 xl:self-end xl:border-l xl:border-ink xl:pl-2.5'
        }`}
      >
        {step.dosing.map((point) => (
          <Dosing key={point.id} point={point} />
        ))}
      </ul>
      <div className="row-span-3 row-start-1 -mb-6 flex flex-col items-center xl:row-span-1 xl:row-start-2 xl:mb-0 xl:block">
        <span
          className={`shrink-0 xl:block xl:h-11 xl:pt-1 ${
            step.dosing.length === 0 ? '' : 'xl:border-l xl:border-ink xl:pl-2.5'
          }`}
        >
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
            maySample={maySample}
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
          <span className="unit">
            <Formula>{formatFormula(point.doseBasis)}</Formula>
          </span>
        </>
      )}
    </li>
  );
}

/** The stretch of water itself: a feed line ends on it in a drop, a tap marks where it is sampled. */
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
      className={`relative block w-1.5 grow bg-verdigris xl:h-1.5 xl:w-full ${isLast ? 'mb-6 xl:mb-0' : ''}`}
    >
      {hasDosing ? (
        <svg
          viewBox="0 0 12 14"
          className="absolute -top-2 -left-[5px] hidden h-3.5 w-3 fill-ink xl:block"
        >
          <path d="M6 0c3 4 5 6 5 8.500a5 5 0 0 1-10 0C1 6 3 4 6 0z" />
        </svg>
      ) : null}
      {hasTap ? (
        <span className="absolute top-3 -left-[5px] size-4 rounded-full border-[3px] border-verdigris bg-chalk-sheet xl:-top-[5px] xl:left-9" />
      ) : null}
      {isFirst ? (
        <span className="absolute -top-1 -left-[3px] h-1 w-3 bg-verdigris xl:-top-[3px] xl:left-0 xl:h-3 xl:w-1" />
      ) : null}
      {isLast ? (
        <span className="absolute -bottom-2 -left-[5px] size-0 border-x-8 border-t-12 border-x-transparent border-t-verdigris xl:-top-[5px] xl:-right-1 xl:bottom-auto xl:left-auto xl:border-x-0 xl:border-y-8 xl:border-l-12 xl:border-y-transparent xl:border-l-verdigris" />
      ) : null}
    </span>
  );
}
