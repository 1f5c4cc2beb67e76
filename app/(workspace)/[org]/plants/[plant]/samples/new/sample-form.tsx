'use client';

import { zodResolver } from '@hookform/resolvers/zod';
import { useRouter } from 'next/navigation';
import { useRef, useState, useTransition, type KeyboardEvent } from 'react';
import { useForm, useWatch, type FieldErrors } from 'react-hook-form';
import { ProblemSummary } from '@/components/forms/problem-summary';
import { TextField } from '@/components/forms/text-field';
import { Button } from '@/components/ui/button';
import { paths } from '@/lib/paths';
import type { EntrySheet } from '@/lib/samples/entry-sheet';
import { sampleInput, type SampleInput, type SampleToKeep } from '@/lib/samples/schema';
import { saveSampleAction } from './actions';
import { LiveFindings } from './live-findings';
import { ResultField } from '@/components/forms/result-field';

/** The whole sheet of one sampling point: typed from top to bottom, solved as you type, saved once. */
export function SampleForm({
  organisationSlug,
  plantSlug,
  timeZone,
  sheet,
}: {
  organisationSlug: string;
  plantSlug: string;
  timeZone: string;
  sheet: EntrySheet;
}) {
  const router = useRouter();
  const [isSaving, startSaving] = useTransition();
  const [serverProblem, setServerProblem] = useState<string>();
  const [clientKey] = useState(() => crypto.randomUUID());
  const fieldsRef = useRef<HTMLFieldSetElement>(null);
  const form = useForm<SampleInput, unknown, SampleToKeep>({
    resolver: zodResolver(sampleInput),
    mode: 'onTouched',
    shouldFocusError: false,
    defaultValues: {
      plantSlug,
      pointSlug: sheet.pointSlug,
      clientKey,
      takenAtLocal: sheet.takenAtLocal,
      comment: '',
      results: sheet.fields.map(({ quantity, unit }) => ({
        quantity,
        unit,
        qualifier: '',
        text: '',
      })),
    },
  });
  const results = useWatch({ control: form.control, name: 'results' });
  const { errors } = form.formState;
  const problems = problemsOf(errors, sheet);

  const save = form.handleSubmit(() => {
    setServerProblem(undefined);
    startSaving(async () => {
      try {
        const answer = await saveSampleAction(organisationSlug, form.getValues());
        if (answer.ok) {
          router.push(paths.sample(organisationSlug, plantSlug, answer.value.sampleId));
          return;
        }
        setServerProblem(answer.message);
        answer.problems.forEach(({ path, message }) =>
          form.setError(path as keyof SampleInput, { message }),
        );
      } catch {
        setServerProblem(
          'Marlwick could not be reached, so nothing was saved. Your figures are still here; try again.',
        );
      }
    });
  });

  const moveOrSave = (event: KeyboardEvent<HTMLFormElement>) => {
    if (event.key === 'Enter' && (event.ctrlKey || event.metaKey)) {
      event.preventDefault();
      void save();
      return;
    }
    const step = { Enter: 1, ArrowDown: 1, ArrowUp: -1 }[event.key];
    const target = event.target;
    if (step === undefined || !(target instanceof HTMLInputElement)) return;
    const inputs = [...(fieldsRef.current?.querySelectorAll<HTMLInputElement>('input') ?? [])];
    const at = inputs.indexOf(target);
    if (at < 0) return;
    event.preventDefault();
    const next = inputs[at + step];
    if (next !== undefined) next.focus();
    else if (step === 1) form.setFocus('comment');
  };

  return (
    <form
      onSubmit={(event) => void save(event)}
      onKeyDown={moveOrSave}
      noValidate
      className="grid grid-cols-[minmax(0,1fr)] gap-x-12 gap-y-8 lg:grid-cols-[minmax(0,1fr)_22rem]"
    >
      <div>
        <ProblemSummary
          problems={problems}
          serverProblem={serverProblem}
          submitCount={form.formState.submitCount}
        />
        <div className="mb-4 max-w-64">
          <TextField
            label="Taken at"
            hint={`Plant time, ${timeZone}`}
            type="datetime-local"
            problem={errors.takenAtLocal?.message}
            {...form.register('takenAtLocal')}
          />
        </div>
        <fieldset ref={fieldsRef}>
          <legend className="sr-only">Results at {sheet.pointName}</legend>
          <div className="ruled border-y border-rule-strong">
            {sheet.fields.map((field, index) => (
              <ResultField
                key={field.quantity}
                field={field}
                written={
                  results[index] ?? {
                    quantity: field.quantity,
                    text: '',
                    qualifier: '',
                    unit: field.unit,
                  }
                }
                textField={form.register(`results.${index}.text`)}
                qualifierField={form.register(`results.${index}.qualifier`)}
                problem={errors.results?.[index]?.text?.message}
              />
            ))}
          </div>
        </fieldset>
        <div className="mt-5 max-w-prose">
          <TextField
            label="Remark"
            hint="Weather, smell, a meter just calibrated: what the next shift should know"
            problem={errors.comment?.message}
            {...form.register('comment')}
          />
        </div>
        <div className="mt-6 flex flex-wrap gap-3">
          <Button type="submit" shape="main" disabled={isSaving}>
            {isSaving ? 'Saving…' : 'Save the sample'}
          </Button>
        </div>
      </div>
      <LiveFindings results={results} />
    </form>
  );
}

function problemsOf(errors: FieldErrors<SampleInput>, sheet: EntrySheet) {
  const atFields = sheet.fields.flatMap(({ quantity, label }, index) => {
    const message = errors.results?.[index]?.text?.message;
    return message === undefined ? [] : [{ fieldId: `result-${quantity}`, label, message }];
  });
  const whole = errors.results?.root?.message ?? errors.results?.message;
  return [
    ...(errors.takenAtLocal?.message === undefined
      ? []
      : [{ label: 'Taken at', message: errors.takenAtLocal.message }]),
    ...(whole === undefined ? [] : [{ label: 'Results', message: whole }]),
    ...atFields,
  ];
}
