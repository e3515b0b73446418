import { useMutation, useQueryClient } from '@tanstack/react-query';
import { boardKey } from '@windrow/client/board/board-queries';
import { ProblemError } from '@windrow/client/http';
import { keepBed } from '@windrow/client/writes/keep-bed';
import { write } from '@windrow/client/writes/write';
import { Button } from '@windrow/ui/controls/button';
import { WriteFault } from '@windrow/ui/controls/faults';
import { announce } from '@windrow/ui/controls/notice-host';
import type { Bed } from '@windrow/ventilation/contract/board';
import type { Stay, StayCorrection, StayDetails } from '@windrow/ventilation/contract/stays';
import { useState } from 'react';
import { useNavigate } from 'react-router-dom';
import { CareFields } from './care-fields.tsx';
import { ChangedMeanwhile } from './changed-meanwhile.tsx';
import { correctionOf, differences } from './correction.ts';
import { OddHeight } from './odd-height.tsx';
import { PatientFields } from './patient-fields.tsx';
import { useDetailsForm } from './use-details-form.ts';

type CorrectFormProps = { bed: Bed; stayId: string; version: number; details: StayDetails };

/**
 * `details` and `version` follow the board. The form holds to those that it began with, so that a change
 * by somebody else is seen before it is written over.
 */
export function CorrectForm({ bed, stayId, version, details }: CorrectFormProps) {
  const queryClient = useQueryClient();
  const navigate = useNavigate();
  const [began, setBegan] = useState({ version, details });
  const { form, oddHeight, isAnswered, takeRefusals } = useDetailsForm(began.details);
  const [isSame, setSame] = useState(false);

  const correct = useMutation({
    mutationFn: (body: StayCorrection) =>
      write<{ stay: Stay; bed: Bed }>({
        method: 'PATCH',
        path: `/api/stays/${encodeURIComponent(stayId)}`,
        body,
        ifMatch: began.version,
      }),
    onSuccess: async ({ bed: corrected }) => {
      await keepBed(queryClient, corrected);
      announce('Details corrected');
      await navigate(`/beds/${bed.unitId}/${bed.bedId}/now`);
      await queryClient.invalidateQueries({ queryKey: ['record', stayId] });
    },
    onError: async (error) => {
      takeRefusals(error);
      // Somebody was first: what stands now is read, and shown beside what was typed.
      if (isConflict(error)) await queryClient.invalidateQueries({ queryKey: boardKey(bed.unitId) });
    },
  });

  const submit = (after: StayDetails) => {
    const correction = correctionOf({ before: began.details, after });
    setSame(correction === null);
    if (correction !== null && isAnswered(after)) correct.mutate(correction);
  };
  const takeTheirs = () => {
    form.reset(details, { keepDirtyValues: true });
    setBegan({ version, details });
    correct.reset();
  };

  return (
    <form
      noValidate
      className="mx-auto flex w-full max-w-4xl flex-col gap-4"
      onSubmit={form.handleSubmit(submit)}
    >
      <h2 className="font-bold text-2xl">Correct details</h2>
      <PatientFields form={form} />
      <CareFields form={form} orders={began.details.orders} />
      {oddHeight && (
        <OddHeight heightCm={oddHeight.heightCm} isKept={oddHeight.isKept} onKeep={oddHeight.keep} />
      )}
      {version !== began.version ? (
        <ChangedMeanwhile
          detail={correct.error instanceof ProblemError ? correct.error.problem.detail : null}
          changes={differences({ before: began.details, after: details })}
          onTake={takeTheirs}
        />
      ) : (
        <WriteFault error={correct.error} />
      )}
      {isSame && <p role="status">Nothing differs from what stands in the record.</p>}
      <div className="flex flex-wrap gap-3">
        <Button type="submit" tone="main" disabled={correct.isPending || version !== began.version}>
          {correct.isPending ? 'Sending …' : 'Record the correction'}
        </Button>
        <Button onClick={() => void navigate(`/beds/${bed.unitId}/${bed.bedId}/now`)}>Not now</Button>
      </div>
    </form>
  );
}

function isConflict(error: unknown): boolean {
  return error instanceof ProblemError && error.problem.status === 409;
}
