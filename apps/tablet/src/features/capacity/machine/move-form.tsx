import { useMutation, useQueryClient } from '@tanstack/react-query';
import { ProblemError } from '@windrow/client/http';
import { write } from '@windrow/client/writes/write';
import { Button } from '@windrow/ui/controls/button';
import { ChoiceGroup } from '@windrow/ui/controls/choice-group';
import { Notice } from '@windrow/ui/controls/notice';
import { announce } from '@windrow/ui/controls/notice-host';
import { TextField } from '@windrow/ui/controls/text-field';
import {
  VENTILATOR_STATES,
  type Ventilator,
  type VentilatorMove,
  type VentilatorState,
} from '@windrow/ventilation/contract/fleet';
import type { Grant } from '@windrow/ventilation/permissions/permissions';
import { type FormEvent, useState } from 'react';
import { FLEET_KEY, movesPath } from '../capacity-queries.ts';
import { BedChoice } from './bed-choice.tsx';
import { type MoveDraft, type MoveErrors, moveFrom } from './move-draft.ts';
import type { UnitNames } from './place-words.ts';
import { StoreChoice } from './store-choice.tsx';

/** What becomes of a machine next, and where. */
export function MoveForm({
  machine,
  moves,
  grants,
  units,
  onMoved,
}: {
  machine: Ventilator;
  moves: readonly VentilatorState[];
  grants: readonly Grant[];
  units: UnitNames;
  onMoved: () => void;
}) {
  const queryClient = useQueryClient();
  const [state, setState] = useState<VentilatorState | null>(null);
  const [entered, setEntered] = useState(() => ({
    bedId: '',
    unitId: machine.homeUnitId ?? '',
    words: '',
    note: '',
  }));
  const [errors, setErrors] = useState<MoveErrors>({});
  const change = (part: Partial<MoveDraft>) => setEntered((before) => ({ ...before, ...part }));

  const mutation = useMutation({
    mutationFn: (body: VentilatorMove) =>
      write<Ventilator>({ method: 'POST', path: movesPath(machine.ventilatorId), body }),
    onSuccess: (moved) => {
      for (const queryKey of [FLEET_KEY, ['capacity']]) void queryClient.invalidateQueries({ queryKey });
      announce(`${moved.assetNumber} is now ${VENTILATOR_STATES[moved.state]}.`);
      onMoved();
    },
  });

  function submit(event: FormEvent): void {
    event.preventDefault();
    if (state === null) return;
    const result = moveFrom({ ...entered, state });
    setErrors('errors' in result ? result.errors : {});
    if ('move' in result) mutation.mutate(result.move);
  }

  return (
    <form noValidate onSubmit={submit} className="flex flex-col gap-4 border-line border-y py-4">
      <ChoiceGroup
        label="Becomes"
        options={moves.map((value) => ({ value, label: VENTILATOR_STATES[value] }))}
        value={state}
        onChoose={(chosen) => {
          setState(chosen);
          setErrors({});
          mutation.reset();
        }}
      />
      {state === 'in-use' && (
        <BedChoice
          grants={grants}
          bedId={entered.bedId}
          error={errors.bedId}
          onChoose={(bedId) => change({ bedId })}
        />
      )}
      {state !== null && state !== 'in-use' && (
        <StoreChoice state={state} units={units} entered={entered} error={errors.words} onChange={change} />
      )}
      {state !== null && (
        <TextField
          label="Note (if any)"
          value={entered.note}
          maxLength={500}
          onChange={(event) => change({ note: event.target.value })}
        />
      )}
      {state === 'retired' && (
        <Notice tone="attention" title={`${machine.assetNumber} leaves the fleet for good.`}>
          <p>A retired machine cannot be brought back; its history stays.</p>
        </Notice>
      )}
      {mutation.error && <NotMoved error={mutation.error} />}
      {state !== null && (
        <div>
          <Button type="submit" tone="main" disabled={mutation.isPending}>
            {mutation.isPending ? 'Recording …' : deed(state, machine)}
          </Button>
        </div>
      )}
    </form>
  );
}

function deed(state: VentilatorState, { assetNumber }: Ventilator): string {
  return state === 'retired' ? `Retire ${assetNumber} for good` : `Record: ${VENTILATOR_STATES[state]}`;
}

function NotMoved({ error }: { error: Error }) {
  const isRefused = error instanceof ProblemError;
  return (
    <Notice tone="attention" isNews title={isRefused ? 'Not recorded' : 'No answer from the server'}>
      <p>
        {isRefused
          ? error.message
          : 'Whether it was recorded is not known: look at the machine’s state before you try again.'}
      </p>
    </Notice>
  );
}
