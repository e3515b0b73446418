import { buttonClass } from '@windrow/ui/controls/button';
import type { Bed, BedStay } from '@windrow/ventilation/contract/board';
import { formatMoment } from '@windrow/ventilation/format/clock';
import { Link } from 'react-router-dom';

/** What can be done with the stay as a whole; each is a page of its own, with its own question. */
export function StayActions({
  bed,
  stay,
  now,
  timeZone,
}: {
  bed: Bed;
  stay: BedStay;
  now: number;
  timeZone: string;
}) {
  const at = `/beds/${bed.unitId}/${bed.bedId}`;
  return (
    <section aria-labelledby="stay-title" className="flex flex-col gap-2 rounded-xl bg-tile px-4 py-3">
      <h2 id="stay-title" className="font-bold text-lg">
        Stay
      </h2>
      <p className="text-ink-muted">
        Admitted {formatMoment(stay.admittedAt, now, timeZone)}
        {stay.orders.checkEveryMinutes !== null &&
          ` · check ordered every ${stay.orders.checkEveryMinutes} min`}
        {stay.orders.gasEveryMinutes !== null && ` · gas ordered every ${stay.orders.gasEveryMinutes} min`}
      </p>
      <div className="flex flex-wrap gap-2">
        <Link to={`${at}/details`} className={buttonClass('quiet')}>
          Correct details
        </Link>
        <Link to={`${at}/transfer`} className={buttonClass('quiet')}>
          Transfer
        </Link>
        <Link to={`${at}/end`} className={buttonClass('quiet')}>
          End the stay
        </Link>
      </div>
    </section>
  );
}
