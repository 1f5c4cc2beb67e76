import type { Metadata } from 'next';
import Link from 'next/link';
import * as z from 'zod';
import { PageHeading } from '@/components/ui/page-heading';
import type { Operation } from '@/lib/api/operation';
import { paths } from '@/lib/paths';
import { errorsOf } from '@/lib/public-api/open-api';
import { OPERATIONS } from '@/lib/public-api/operations';

export const metadata: Metadata = { title: 'API guide' };

/** The public API for people, from the same list that serves it and that makes the OpenAPI document. */
export default function ApiGuidePage() {
  return (
    <main className="mx-auto max-w-page px-4 py-6 sm:px-8 sm:py-8">
      <PageHeading title="API guide">
        Version 1, below <span className="figure">/api/v1</span>. For programs:{' '}
        <a href={paths.openApi}>the OpenAPI 3.1 document</a>.
      </PageHeading>
      <div className="grid max-w-prose gap-3">
        <p>
          Send an API token as <span className="figure">Authorization: Bearer mwk_…</span>. A
          manager or owner makes one on the Tokens page of the organisation; it can do what its
          maker can, narrowed to what was ticked, until it expires or is revoked.
        </p>
        <p>
          Lists come in pages: give <span className="figure">next</span> of one as{' '}
          <span className="figure">cursor</span> of the following. What creates something wants an{' '}
          <span className="figure">Idempotency-Key</span> of yours: the same key with the same
          request makes one thing and answers alike however often it is sent. What changes something
          wants <span className="figure">If-Match</span> with the{' '}
          <span className="figure">ETag</span> you read. Errors are{' '}
          <span className="figure">{'{"error":{"code","message"}}'}</span>.
        </p>
        <p>
          A dose in an answer is a suggestion with its cautions beside it: the licensed operator in
          charge decides.
        </p>
      </div>
      <nav aria-label="Operations" className="mt-6">
        <ul className="columns-1 gap-x-8 sm:columns-2">
          {OPERATIONS.map(({ id, summary }) => (
            <li key={id}>
              <a href={`#${id}`} className="inline-flex min-h-6 items-center py-1">
                {summary}
              </a>
            </li>
          ))}
        </ul>
      </nav>
      {OPERATIONS.map((operation) => (
        <OperationWords key={operation.id} operation={operation} />
      ))}
      <p className="mt-8">
        <Link href={paths.home}>To the log</Link>
      </p>
    </main>
  );
}

function OperationWords({ operation }: { operation: Operation }) {
  const { id, method, path, summary, description, permission, query, body, answer } = operation;
  return (
    <section aria-labelledby={id} className="mt-8 border-t border-rule-strong pt-4">
      <h2 id={id} className="text-xl">
        {summary}
      </h2>
      <p className="figure mt-1 break-all whitespace-normal">
        <strong>{method.toUpperCase()}</strong> /api/v1{path}
      </p>
      <p className="mt-1 text-ink-soft">
        {description === undefined ? '' : `${description} `}Scope{' '}
        <span className="figure">{permission}</span>.
      </p>
      <div className="mt-2 grid gap-x-8 sm:grid-cols-2">
        <Shape title="Query" schema={query} />
        {body === undefined ? null : <Shape title="Body" schema={body} />}
        <Shape title="Answer" schema={answer} io="output" />
        <details>
          <summary className="flex min-h-touch items-center font-semibold text-verdigris">
            ▸ Errors
          </summary>
          <dl className="grid grid-cols-[auto_1fr] gap-x-4 text-sm">
            {Object.entries(errorsOf(operation)).map(([status, words]) => (
              <div key={status} className="contents">
                <dt className="figure">{status}</dt>
                <dd>{words}</dd>
              </div>
            ))}
          </dl>
        </details>
      </div>
    </section>
  );
}

function Shape({
  title,
  schema,
  io = 'input',
}: {
  title: string;
  schema: z.ZodType;
  io?: 'input' | 'output';
}) {
  const shape = z.toJSONSchema(schema, { io, unrepresentable: 'any' });
  delete shape.$schema;
  if ('properties' in shape && Object.keys(shape.properties ?? {}).length === 0) return null;
  return (
    <details>
      <summary className="flex min-h-touch items-center font-semibold text-verdigris">
        ▸ {title}
      </summary>
      <pre
        className="overflow-x-auto border border-rule bg-chalk p-3 font-figure text-[0.85rem]"
        tabIndex={0}
      >
        {JSON.stringify(shape, null, 2)}
      </pre>
    </details>
  );
}
