import { useMutation } from '@tanstack/react-query';
import { write } from '@windrow/client/writes/write';
import { Button } from '@windrow/ui/controls/button';
import { Dialog, DialogActions } from '@windrow/ui/controls/dialog';
import { announce } from '@windrow/ui/controls/notice-host';
import type { Bed, BedPlace } from '@windrow/ventilation/contract/board';
import { NotSaved } from '../not-saved.tsx';
import { useBedsChanged } from './use-beds-changed.ts';

/** Opens or closes a bed. Closed means that it has no staff, so it takes no patient and counts nowhere as free. */
export function BedDialog({ bed, onClose }: { bed: BedPlace; onClose: () => void }) {
  const changed = useBedsChanged();
  const mutation = useMutation({
    mutationFn: (isOpen: boolean) =>
      write<Bed>({ method: 'PATCH', path: `/api/beds/${encodeURIComponent(bed.bedId)}`, body: { isOpen } }),
    onSuccess: async ({ label, isOpen }) => {
      await changed();
      announce(`Bed ${label} is ${isOpen ? 'open' : 'closed'}.`);
      onClose();
    },
  });
  const words = bed.isOpen
    ? 'It is open: it has staff and can take a patient. Closed, it takes none and is not counted as free.'
    : 'It is closed: it takes no patient and is not counted as free.';
  return (
    <Dialog open onClose={onClose} title={`Bed ${bed.label}`} description={words}>
      {mutation.error && <NotSaved error={mutation.error} />}
      <DialogActions>
        <Button tone="main" disabled={mutation.isPending} onClick={() => mutation.mutate(!bed.isOpen)}>
          {bed.isOpen ? `Close bed ${bed.label}` : `Open bed ${bed.label}`}
        </Button>
        <Button onClick={onClose}>Cancel</Button>
      </DialogActions>
    </Dialog>
  );
}
