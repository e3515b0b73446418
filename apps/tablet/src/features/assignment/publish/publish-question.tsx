import { Button } from '@windrow/ui/controls/button';
import { Dialog, DialogActions } from '@windrow/ui/controls/dialog';

/** Asked only where something is left undone; a full and fair assignment is published without a word. */
export function PublishQuestion({
  doubts,
  onPublish,
  onClose,
}: {
  doubts: readonly string[];
  onPublish: () => void;
  onClose: () => void;
}) {
  return (
    <Dialog
      open
      onClose={onClose}
      title="Publish it so?"
      description="Every screen of the unit shows it at once."
    >
      <ul className="flex list-disc flex-col gap-1 pl-5">
        {doubts.map((doubt) => (
          <li key={doubt}>{doubt}</li>
        ))}
      </ul>
      <DialogActions>
        <Button tone="main" onClick={onPublish}>
          Publish so
        </Button>
        <Button onClick={onClose}>Back to the beds</Button>
      </DialogActions>
    </Dialog>
  );
}
