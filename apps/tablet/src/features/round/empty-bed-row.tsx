import { buttonClass } from '@windrow/ui/controls/button';
import type { Bed } from '@windrow/ventilation/contract/board';
import { type Grant, may } from '@windrow/ventilation/permissions/permissions';
import { Link } from 'react-router-dom';

/** A bed without a patient: open for one, or closed. */
export function EmptyBedRow({ bed, grants }: { bed: Bed; grants: readonly Grant[] }) {
  const mayAdmit = bed.isOpen && may(grants, 'place-stay', bed.unitId);
  return (
    <article className="flex min-h-16 flex-wrap items-center gap-4 rounded-xl border-2 border-line border-dashed px-3 py-1">
      <h3 className="min-w-14 font-bold text-3xl text-ink-muted tabular-nums">
        <span className="sr-only">Bed </span>
        {bed.label}
      </h3>
      <p className="text-ink-muted">{bed.isOpen ? 'empty' : 'closed'}</p>
      {bed.ventilator && (
        <p className="text-ink-muted">ventilator {bed.ventilator.assetNumber} stands here</p>
      )}
      {mayAdmit && (
        <Link
          to={`/admit/${bed.unitId}/${bed.bedId}`}
          className={`${buttonClass('quiet')} ml-auto`}
          aria-label={`Admit to bed ${bed.label}`}
        >
          Admit
        </Link>
      )}
    </article>
  );
}
