import { useMutation, useQuery, useQueryClient } from '@tanstack/react-query';
import { boardKey } from '@windrow/client/board/board-queries';
import { write } from '@windrow/client/writes/write';
import { Button } from '@windrow/ui/controls/button';
import { Dialog, DialogActions } from '@windrow/ui/controls/dialog';
import { WriteFault } from '@windrow/ui/controls/faults';
import { announce } from '@windrow/ui/controls/notice-host';
import { SelectField } from '@windrow/ui/controls/select-field';
import type { Bed } from '@windrow/ventilation/contract/board';
import {
  VENTILATOR_CLASSES,
  type Ventilator,
  type VentilatorMove,
} from '@windrow/ventilation/contract/fleet';
import { type Grant, may } from '@windrow/ventilation/permissions/permissions';
import { useCallback, useState } from 'react';
import { readyVentilatorsQuery } from './ventilator-queries.ts';

/** The machine of the fleet that stands at the bed: taken into use, or sent to be cleaned. */
export function BedVentilator({ bed, grants }: { bed: Bed; grants: readonly Grant[] }) {
  const mayMove = may(grants, 'use-ventilator', bed.unitId);
  return (
    <section aria-labelledby="machine-title" className="flex flex-col gap-2 rounded-xl bg-tile px-4 py-3">
      <h2 id="machine-title" className="font-bold text-lg">
        Ventilator
      </h2>
      {bed.ventilator ? (
        <p>
          <span className="font-bold">{bed.ventilator.assetNumber}</span> · {bed.ventilator.model}
        </p>
      ) : (
        <p className="text-ink-muted">No machine of the fleet stands at this bed.</p>
      )}
      {mayMove &&
        (bed.ventilator ? <ReturnMachine bed={bed} machine={bed.ventilator} /> : <TakeMachine bed={bed} />)}
    </section>
  );
}

function useMove(bed: Bed, said: string) {
  const queryClient = useQueryClient();
  return useMutation({
    mutationFn: ({ ventilatorId, move }: { ventilatorId: string; move: VentilatorMove }) =>
      write<Ventilator>({
        method: 'POST',
        path: `/api/ventilators/${encodeURIComponent(ventilatorId)}/moves`,
        body: move,
      }),
    onSuccess: async () => {
      announce(said);
      await Promise.all([
        queryClient.invalidateQueries({ queryKey: ['fleet'] }),
        queryClient.invalidateQueries({ queryKey: boardKey(bed.unitId) }),
      ]);
    },
  });
}

function ReturnMachine({ bed, machine }: { bed: Bed; machine: NonNullable<Bed['ventilator']> }) {
  const [isAsking, setAsking] = useState(false);
  const close = useCallback(() => setAsking(false), []);
  const move = useMove(bed, `${machine.assetNumber} goes to cleaning`);
  return (
    <>
      <div>
        <Button tone="quiet" onClick={() => setAsking(true)}>
          Return to cleaning
        </Button>
      </div>
      <Dialog
        open={isAsking}
        onClose={close}
        title={`Return ${machine.assetNumber} to cleaning?`}
        description={`It leaves bed ${bed.label} and counts as not ready until it has been cleaned.`}
      >
        <WriteFault error={move.error} />
        <DialogActions>
          <Button
            tone="main"
            disabled={move.isPending}
            onClick={() =>
              move.mutate(
                { ventilatorId: machine.ventilatorId, move: { state: 'cleaning', unitId: bed.unitId } },
                { onSuccess: close },
              )
            }
          >
            {move.isPending ? 'Sending …' : 'Return to cleaning'}
          </Button>
          <Button onClick={close}>Leave it here</Button>
        </DialogActions>
      </Dialog>
    </>
  );
}

function TakeMachine({ bed }: { bed: Bed }) {
  const ready = useQuery(readyVentilatorsQuery());
  const [ventilatorId, setVentilatorId] = useState('');
  const chosen = ready.data?.find((machine) => machine.ventilatorId === ventilatorId);
  const move = useMove(bed, `${chosen?.assetNumber ?? 'The ventilator'} is in use at bed ${bed.label}`);

  if (ready.isPending) return <p className="text-ink-muted">Reading which machines are ready …</p>;
  if (!ready.data) return <WriteFault error={ready.error} />;
  if (ready.data.length === 0) return <p className="font-bold">No ventilator is ready.</p>;
  return (
    <div className="flex flex-col items-start gap-2">
      <SelectField
        label="Ready machines"
        empty="Choose"
        options={byNearness(ready.data, bed.unitId).map(optionOf)}
        value={chosen ? ventilatorId : ''}
        onChange={(event) => setVentilatorId(event.target.value)}
      />
      <WriteFault error={move.error} />
      <Button
        disabled={!chosen || move.isPending}
        onClick={() =>
          chosen &&
          move.mutate({ ventilatorId: chosen.ventilatorId, move: { state: 'in-use', bedId: bed.bedId } })
        }
      >
        {move.isPending ? 'Sending …' : 'Take into use'}
      </Button>
    </div>
  );
}

/** Those of this unit first. */
function byNearness(machines: readonly Ventilator[], unitId: string): Ventilator[] {
  const far = (machine: Ventilator) => (machine.place.unitId === unitId ? 0 : 1);
  return [...machines].sort(
    (a, b) => far(a) - far(b) || a.assetNumber.localeCompare(b.assetNumber, 'en', { numeric: true }),
  );
}

function optionOf({ ventilatorId, assetNumber, model, class: kind, place }: Ventilator) {
  const where = place.words ? `, ${place.words}` : '';
  return { value: ventilatorId, label: `${assetNumber} · ${model} · ${VENTILATOR_CLASSES[kind]}${where}` };
}
