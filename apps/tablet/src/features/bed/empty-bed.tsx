import { buttonClass } from '@windrow/ui/controls/button';
import { EmptyState } from '@windrow/ui/controls/states';
import type { Bed } from '@windrow/ventilation/contract/board';
import { type Grant, may } from '@windrow/ventilation/permissions/permissions';
import { Link } from 'react-router-dom';
import { BedVentilator } from './now/bed-ventilator.tsx';

/** A bed without a patient: a machine may still stand there. */
export function EmptyBed({ bed, grants }: { bed: Bed; grants: readonly Grant[] }) {
  const mayAdmit = bed.isOpen && may(grants, 'place-stay', bed.unitId);
  return (
    <div className="mx-auto flex w-full max-w-3xl flex-col gap-4">
      <EmptyState title={`Bed ${bed.label} is ${bed.isOpen ? 'empty' : 'closed'}`}>
        <div className="flex flex-wrap gap-3">
          {mayAdmit && (
            <Link to={`/admit/${bed.unitId}/${bed.bedId}`} className={buttonClass('main')}>
              Admit
            </Link>
          )}
          <Link to={`/round/${bed.unitId}`} className={buttonClass()}>
            To the round
          </Link>
        </div>
      </EmptyState>
      {bed.ventilator && <BedVentilator bed={bed} grants={grants} />}
    </div>
  );
}
