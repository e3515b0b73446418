import { Button } from '@windrow/ui/controls/button';
import { Dialog, DialogActions } from '@windrow/ui/controls/dialog';
import { SelectField } from '@windrow/ui/controls/select-field';
import { TASK_LABELS } from '@windrow/ventilation/assignment/bed-minutes';
import type { Load } from '@windrow/ventilation/assignment/loads';
import type { BedWork } from './bed-work.ts';
import { inMinutes, sumOf } from './words.ts';

export type Choice = { load: Load; isHolder: boolean };

/** One bed: what its minutes are made of, and whom to give it to. */
export function BedDialog({
  work,
  choices,
  nobodyHasIt,
  coverId,
  onGive,
  onCover,
  onClose,
}: {
  work: BedWork;
  /** Each person with the load that they would then have; empty for those who only look. */
  choices: readonly Choice[];
  nobodyHasIt: boolean;
  /** Who stands in for whoever has it, during breaks. */
  coverId: string | null;
  onGive: (personId: string | null) => void;
  onCover: (personId: string | null) => void;
  onClose: () => void;
}) {
  return (
    <Dialog open onClose={onClose} title={`Bed ${work.label} · ${inMinutes(work.minutes.total)}`}>
      <MinutesTable work={work} />
      {work.nowWith && <p>Now with {work.nowWith.displayName}.</p>}
      {choices.length > 0 && (
        <section aria-labelledby="give-to" className="flex flex-col gap-2">
          <h3 id="give-to" className="font-bold text-lg">
            Give to
          </h3>
          <ul className="flex flex-col gap-2">
            {choices.map((choice) => (
              <li key={choice.load.person.personId}>
                <GiveButton choice={choice} onGive={onGive} />
              </li>
            ))}
            <li>
              <Button tone="quiet" className="w-full" disabled={nobodyHasIt} onClick={() => onGive(null)}>
                {nobodyHasIt ? 'Nobody has it' : 'Nobody'}
              </Button>
            </li>
          </ul>
        </section>
      )}
      {choices.length > 1 && !nobodyHasIt && (
        <SelectField
          label="Cover, for breaks"
          empty="nobody"
          options={choices
            .filter(({ isHolder }) => !isHolder)
            .map(({ load: { person } }) => ({ value: person.personId, label: person.displayName }))}
          value={coverId ?? ''}
          onChange={(event) => onCover(event.target.value || null)}
        />
      )}
      <DialogActions>
        <Button onClick={onClose}>Close</Button>
      </DialogActions>
    </Dialog>
  );
}

function GiveButton({
  choice: { load, isHolder },
  onGive,
}: {
  choice: Choice;
  onGive: (personId: string) => void;
}) {
  const { person } = load;
  return (
    <Button tone="quiet" className="w-full" disabled={isHolder} onClick={() => onGive(person.personId)}>
      <span className="flex w-full flex-wrap items-baseline justify-between gap-x-4">
        <span className="text-left">{person.displayName}</span>
        <span className={`text-sm ${load.over > 0 ? 'text-flag-text' : 'font-normal text-ink-muted'}`}>
          {isHolder ? `has it: ${sumOf(load)}` : `would have ${sumOf(load)}`}
        </span>
      </span>
    </Button>
  );
}

function MinutesTable({ work: { minutes, support } }: { work: BedWork }) {
  if (minutes.parts.length === 0)
    return <p>{support}: nothing in the unit’s task list is due for it in this shift.</p>;
  return (
    <table className="w-full">
      <caption className="pb-1 text-left text-ink-muted">
        {support ?? 'Support not recorded yet, planned as a ventilated patient’s checks'}
      </caption>
      <thead className="sr-only">
        <tr>
          <th scope="col">Task</th>
          <th scope="col">Times in the shift</th>
          <th scope="col">Minutes</th>
        </tr>
      </thead>
      <tbody>
        {minutes.parts.map(({ task, times, minutes: taken }) => (
          <tr key={task} className="border-line border-b">
            <th scope="row" className="py-2 text-left font-normal">
              {TASK_LABELS[task]}
            </th>
            <td className="py-2 text-right tabular-nums">
              {times} × {inMinutes(taken / times)}
            </td>
            <td className="py-2 pl-4 text-right font-bold tabular-nums">{inMinutes(taken)}</td>
          </tr>
        ))}
      </tbody>
    </table>
  );
}
