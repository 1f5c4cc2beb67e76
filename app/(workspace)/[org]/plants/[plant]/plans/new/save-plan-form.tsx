'use client';

import { useRouter } from 'next/navigation';
import { useState, useTransition } from 'react';
import { TextField } from '@/components/forms/text-field';
import { Button } from '@/components/ui/button';
import { Notice } from '@/components/ui/notice';
import { paths } from '@/lib/paths';
import { savePlanAction } from './actions';
import type { PlanChoice, WorkedPlan } from './plan-choice';

/** Saves the plan once; the server solves it again and refuses what it does not find itself. */
export function SavePlan({
  organisationSlug,
  plantSlug,
  sampleId,
  choice,
  plan,
}: {
  organisationSlug: string;
  plantSlug: string;
  sampleId: string;
  choice: PlanChoice;
  plan: WorkedPlan;
}) {
  const router = useRouter();
  const [clientKey] = useState(() => crypto.randomUUID());
  const [reason, setReason] = useState('');
  const [problem, setProblem] = useState<string>();
  const [isSaving, startSaving] = useTransition();
  const { after, doseMgL, targetValue } = plan;

  const save = () => {
    if (after === null || doseMgL === null || targetValue === null) {
      setProblem(plan.problem ?? 'Write a target and a dose first.');
      return;
    }
    setProblem(undefined);
    startSaving(async () => {
      try {
        const answer = await savePlanAction(organisationSlug, {
          plantSlug,
          sampleId,
          clientKey,
          reagent: choice.reagent,
          doseMgL,
          target: { quantity: choice.quantity, value: targetValue },
          previewedPH: after.pH,
          reason,
        });
        if (answer.ok) router.push(paths.plan(organisationSlug, plantSlug, answer.value.planId));
        else
          setProblem([answer.message, ...answer.problems.map(({ message }) => message)].join(' '));
      } catch {
        setProblem('Marlwick could not be reached, so nothing was saved. Try again.');
      }
    });
  };

  return (
    <div className="grid gap-3">
      <TextField
        label="Why this dose"
        hint="For whoever reads the log next year"
        value={reason}
        maxLength={2000}
        onChange={(event) => setReason(event.target.value)}
      />
      {problem === undefined ? null : (
        <Notice tone="act" title="Not saved" role="alert">
          {problem}
        </Notice>
      )}
      <div>
        <Button shape="main" onClick={save} disabled={isSaving}>
          {isSaving ? 'Saving…' : 'Save as a plan'}
        </Button>
      </div>
    </div>
  );
}
