import { useNow } from '@windrow/client/clock/use-now';
import type { PolicyVersion } from '@windrow/ventilation/contract/setup';
import { formatMoment } from '@windrow/ventilation/format/clock';

/** Which version holds, by whom, since when and why. */
export function PolicyStanding({ version, timeZone }: { version: PolicyVersion; timeZone: string }) {
  const now = useNow(60_000);
  const who = version.changedBy ? ` by ${version.changedBy}` : '';
  return (
    <p className="rounded-xl bg-tile px-4 py-3">
      <strong>Version {version.version}</strong>
      {who}, since {formatMoment(version.changedAt, now, timeZone)}: {version.reason}
    </p>
  );
}
