import type { Metadata } from 'next';
import Link from 'next/link';
import { HowSure } from '@/components/how-sure/how-sure';
import { IndexList } from '@/components/ledger/index-list';
import { IndexNotes } from '@/components/ledger/index-notes';
import { buttonClass } from '@/components/ui/button';
import { Notice } from '@/components/ui/notice';
import { PageHeading } from '@/components/ui/page-heading';
import { roleMay } from '@/lib/auth/permissions';
import { formatDayTime } from '@/lib/format';
import { paths } from '@/lib/paths';
import { getSample } from '@/lib/samples/get-sample';
import { INDEX_KEYS } from '@/lib/samples/indices';
import { measuredValues } from '@/lib/samples/measured-values';
import { solveSample } from '@/lib/samples/solve-sample';
import { orNotFound } from '@/app/or-not-found';
import { pagePlant } from '../../page-plant';
import { MetalSolubility } from './metal-solubility';
import { ResultTable } from './result-table';

export const metadata: Metadata = { title: 'Sample' };

/** Indices whose uncertainty an operator acts on. */
const BANDED = [
  'calciteIndex',
  'langelier',
  'precipitationPotential',
  'bufferIntensity',
  'carbonDioxide',
] as const;

export default async function SamplePage({
  params,
}: {
  params: Promise<{ org: string; plant: string; sample: string }>;
}) {
  const { actor, plant } = await pagePlant(params, 'sample.read');
  const sample = await orNotFound(getSample(actor, plant, (await params).sample));
  const organisationSlug = actor.organisation.slug;
  const values = measuredValues(sample.results);
  const solved = solveSample(values);
  const isSolved = sample.solution !== null && sample.solution.refusal === null;
  return (
    <>
      <PageHeading
        title={`${sample.pointName}, ${formatDayTime(sample.takenAt, plant.timeZone)}`}
        actions={
          <>
            {isSolved && roleMay(actor.role, 'plan.write') ? (
              <Link
                href={paths.newPlan(organisationSlug, plant.slug, sample.id)}
                className={buttonClass('main')}
              >
                Plan a dose from this water
              </Link>
            ) : null}
            <Link
              href={paths.trends(
                organisationSlug,
                plant.slug,
                `point=${sample.pointSlug}&quantity=pH,calciteIndex`,
              )}
              className={buttonClass('plain')}
            >
              See it over time
            </Link>
          </>
        }
      >
        Entered by {sample.enteredBy} on {formatDayTime(sample.enteredAt, plant.timeZone)}.
      </PageHeading>
      <div className="grid grid-cols-[minmax(0,1fr)] gap-x-12 gap-y-8 lg:grid-cols-2">
        <section aria-labelledby="results">
          <h2 id="results" className="text-xl">
            Results, as written
          </h2>
          <ResultTable results={sample.results} />
          {sample.comment === '' ? null : (
            <p className="margin-rule mt-4 pl-4">
              <span className="log-label block">Remark</span>
              {sample.comment}
            </p>
          )}
        </section>
        <section aria-labelledby="indices">
          <h2 id="indices" className="text-xl">
            What this water says
          </h2>
          {isSolved ? (
            <>
              <IndexList indices={sample.indices} shown={INDEX_KEYS} />
              <IndexNotes shown={INDEX_KEYS} />
              <HowSure values={values} shown={BANDED} />
              {solved.ok ? <MetalSolubility water={solved.water} /> : null}
            </>
          ) : (
            <div className="mt-2">
              <Notice tone="watch" title="Not solved">
                {sample.solution?.refusal ??
                  'Temperature, pH and alkalinity are needed before the water can be solved.'}
              </Notice>
            </div>
          )}
          {sample.solution === null ? null : (
            <details className="mt-4 text-sm text-ink-soft">
              <summary className="min-h-6">
                Engine {sample.solution.engineVersion} and {sample.solution.assumptions.length}{' '}
                assumptions
              </summary>
              <ul className="mt-1 list-disc pl-5">
                {sample.solution.assumptions.map((sentence) => (
                  <li key={sentence}>{sentence}</li>
                ))}
                <li>
                  Constants <span className="figure">{sample.solution.constantsHash}</span>
                </li>
              </ul>
            </details>
          )}
        </section>
      </div>
    </>
  );
}
