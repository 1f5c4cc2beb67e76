'use client';

import { useState } from 'react';
import { TextField } from '@/components/forms/text-field';
import { useAction } from '@/components/forms/use-action';
import { Button } from '@/components/ui/button';
import { Figure } from '@/components/ui/figure';
import { Formula } from '@/components/ui/formula';
import { Notice } from '@/components/ui/notice';
import type { Target } from '@/lib/plants/schema';
import { changeTargetAction } from './actions';

const BOUNDS = [
  { name: 'lowest', label: 'Lowest' },
  { name: 'preferred', label: 'Preferred' },
  { name: 'highest', label: 'Highest' },
] as const;

type Texts = Readonly<Record<(typeof BOUNDS)[number]['name'] | 'basis' | 'reason', string>>;

const textsOf = ({ lowest, preferred, highest, basis }: Target): Texts => ({
  lowest: lowest === null ? '' : String(lowest),
  preferred: preferred === null ? '' : String(preferred),
  highest: highest === null ? '' : String(highest),
  basis,
  reason: '',
});

const NUMBER = /^[-\u2212]?\d+(?:\.\d+)?$/;
/** Empty is open; what is no plain number is NaN, which the server refuses by name. */
const boundOf = (text: string): number | null => {
  const plain = text.trim();
  if (plain === '') return null;
  return NUMBER.test(plain) ? Number(plain.replace('\u2212', '-')) : Number.NaN;
};

/** One target on one line; changing opens beneath it, from the version shown. */
export function TargetRow({
  organisationSlug,
  plantSlug,
  target,
  label,
  unit,
  mayChange,
}: {
  organisationSlug: string;
  plantSlug: string;
  target: Target;
  label: string;
  unit: string;
  mayChange: boolean;
}) {
  const { run, problem, isBusy } = useAction();
  const [isOpen, setIsOpen] = useState(false);
  const [texts, setTexts] = useState(textsOf(target));
  const [wrong, setWrong] = useState<string>();

  const save = () => {
    const odd = BOUNDS.find(({ name }) => Number.isNaN(boundOf(texts[name])));
    if (odd !== undefined) {
      setWrong(`${odd.label}: write a number with a decimal point, or leave it open.`);
      return;
    }
    setWrong(undefined);
    run(
      () =>
        changeTargetAction(organisationSlug, {
          plantSlug,
          targetId: target.id,
          version: target.version,
          bounds: {
            lowest: boundOf(texts.lowest),
            preferred: boundOf(texts.preferred),
            highest: boundOf(texts.highest),
            basis: texts.basis,
            reason: texts.reason,
          },
        }),
      () => setIsOpen(false),
    );
  };

  return (
    <li className="border-b border-rule py-3 last:border-b-0">
      <div className="flex flex-wrap items-center justify-between gap-x-6 gap-y-2">
        <div className="min-w-0">
          <p>
            <strong>{label}</strong> <Range target={target} unit={unit} />
          </p>
          <p className="text-sm text-ink-soft">
            Version {target.version}.{' '}
            {target.basis === '' ? 'No basis written down.' : target.basis}
          </p>
        </div>
        {mayChange ? (
          <Button
            aria-expanded={isOpen}
            onClick={() => {
              setTexts(textsOf(target));
              setIsOpen(!isOpen);
            }}
          >
            Change<span className="sr-only"> {label}</span>
          </Button>
        ) : null}
      </div>
      {isOpen ? (
        <form
          className="mt-3 grid gap-4 pb-2"
          noValidate
          onSubmit={(event) => {
            event.preventDefault();
            save();
          }}
        >
          <div className="grid max-w-2xl gap-4 sm:grid-cols-3">
            {BOUNDS.map(({ name, label: boundLabel }) => (
              <TextField
                key={name}
                label={
                  <>
                    {boundLabel}
                    {unit === '' ? null : (
                      <span className="unit ml-1">
                        <Formula>{unit}</Formula>
                      </span>
                    )}
                  </>
                }
                autoComplete="off"
                value={texts[name]}
                onChange={({ target: input }) => setTexts({ ...texts, [name]: input.value })}
              />
            ))}
          </div>
          <div className="grid max-w-2xl gap-4">
            <TextField
              label="Basis"
              hint="The permit, code or agreement it comes from"
              value={texts.basis}
              maxLength={300}
              onChange={({ target: input }) => setTexts({ ...texts, basis: input.value })}
            />
            <TextField
              label="Why it changes"
              value={texts.reason}
              maxLength={500}
              onChange={({ target: input }) => setTexts({ ...texts, reason: input.value })}
            />
          </div>
          {(wrong ?? problem) === undefined ? null : (
            <Notice tone="act" title="Not changed" role="alert">
              {wrong ?? problem}
            </Notice>
          )}
          <div className="flex gap-3">
            <Button type="submit" shape="main" disabled={isBusy}>
              {isBusy ? 'Keeping…' : 'Keep the change'}
            </Button>
            <Button onClick={() => setIsOpen(false)}>Leave it</Button>
          </div>
        </form>
      ) : null}
    </li>
  );
}

function Range({ target: { lowest, highest, preferred }, unit }: { target: Target; unit: string }) {
  return (
    <>
      {lowest === null ? null : (
        <>
          from <Figure unit={highest === null ? unit : ''}>{signed(lowest)}</Figure>{' '}
        </>
      )}
      {highest === null ? null : (
        <>
          {lowest === null ? 'up to' : 'to'} <Figure unit={unit}>{signed(highest)}</Figure>
        </>
      )}
      {preferred === null ? null : (
        <>
          , best <Figure>{signed(preferred)}</Figure>
        </>
      )}
    </>
  );
}

/** As it was set, with a real minus. */
const signed = (value: number): string => String(value).replace('-', '\u2212');
