import { useNow } from '@windrow/client/clock/use-now';
import { Button } from '@windrow/ui/controls/button';
import { Notice } from '@windrow/ui/controls/notice';
import type { PolicyVersion } from '@windrow/ventilation/contract/setup';
import { formatMoment } from '@windrow/ventilation/format/clock';
import type { Policy } from '@windrow/ventilation/policy/policy';
import { DifferenceTable } from './difference-table.tsx';
import { policyDifferences } from './policy-merge.ts';
import type { PolicyEditing } from './use-policy-form.ts';

/** Somebody saved another version meanwhile: who, when and why, what differs, and the two ways on. */
export function NewerPolicy({
  theirs,
  mine,
  timeZone,
  editing,
}: {
  theirs: PolicyVersion;
  mine: Policy;
  timeZone: string;
  editing: PolicyEditing;
}) {
  const now = useNow(60_000);
  const who = theirs.changedBy ?? 'Somebody';
  return (
    <Notice
      tone="attention"
      isNews
      title={`${who} saved version ${theirs.version} at ${formatMoment(theirs.changedAt, now, timeZone)}. Your changes are kept here and are not saved.`}
    >
      <p>Their reason: {theirs.reason}</p>
      <DifferenceTable
        differences={policyDifferences({ theirs: theirs.policy, mine })}
        theirsName={who}
        mineName="Yours"
      />
      <div className="flex flex-wrap gap-3">
        <Button onClick={() => editing.takeTheirs(theirs)}>Take theirs</Button>
        <Button onClick={() => editing.putOnTop(theirs)}>Put mine on top of theirs</Button>
      </div>
      <p className="text-ink-muted text-sm">
        On top: values that you changed stand as you set them, all others as {who} saved them. Nothing is
        saved until you press Save.
      </p>
    </Notice>
  );
}
