import { useMutation, useQueryClient } from '@tanstack/react-query';
import { serverNow } from '@windrow/client/clock/server-clock';
import { actKeys } from '@windrow/client/writes/act-key';
import { keepBed } from '@windrow/client/writes/keep-bed';
import { write } from '@windrow/client/writes/write';
import { Button } from '@windrow/ui/controls/button';
import { WriteFault } from '@windrow/ui/controls/faults';
import { announce } from '@windrow/ui/controls/notice-host';
import type { Bed, Unit } from '@windrow/ventilation/contract/board';
import type { Admission, Stay, StayDetails } from '@windrow/ventilation/contract/stays';
import { dayIn } from '@windrow/ventilation/format/zoned-time';
import { useState } from 'react';
import { useNavigate } from 'react-router-dom';
import { type AdmittedAt, AdmittedAtFields, judgeAdmitted } from './admitted-at.tsx';
import { CareFields } from './care-fields.tsx';
import { NO_DETAILS } from './details-form-schema.ts';
import { OddHeight } from './odd-height.tsx';
import { PatientFields } from './patient-fields.tsx';
import { useDetailsForm } from './use-details-form.ts';

export function AdmitForm({ bed, unit }: { bed: Bed; unit: Unit }) {
  const queryClient = useQueryClient();
  const navigate = useNavigate();
  const { form, oddHeight, isAnswered, takeRefusals } = useDetailsForm(NO_DETAILS);
  const [admitted, setAdmitted] = useState<AdmittedAt>({ is: 'now' });
  const [fault, setFault] = useState<string | null>(null);
  const [keyOf] = useState(actKeys);
  const [sent, setSent] = useState<{ words: string; body: Admission } | null>(null);

  const admit = useMutation({
    mutationFn: (body: Admission) =>
      write<{ stay: Stay; bed: Bed }>({ method: 'POST', path: '/api/stays', body, key: keyOf(body) }),
    onSuccess: async ({ bed: taken }) => {
      await keepBed(queryClient, taken);
      announce(`Admitted to bed ${bed.label}`);
      await navigate(`/beds/${bed.unitId}/${bed.bedId}/now`, { replace: true });
    },
    onError: takeRefusals,
  });

  const submit = (details: StayDetails) => {
    const judged = judgeAdmitted({ admitted, now: serverNow(), timeZone: unit.timeZone });
    setFault('fault' in judged ? judged.fault : null);
    if ('fault' in judged || !isAnswered(details)) return;
    // The same words sent again are the same act: "now" stays the moment at which they were first sent.
    const words = JSON.stringify([details, admitted]);
    const body =
      sent?.words === words
        ? sent.body
        : { ...details, bedId: bed.bedId, observedAt: new Date(judged.at).toISOString() };
    setSent({ words, body });
    admit.mutate(body);
  };

  return (
    <form
      noValidate
      className="mx-auto flex w-full max-w-4xl flex-col gap-4"
      onSubmit={form.handleSubmit(submit)}
    >
      <h1 className="font-bold text-2xl">
        Admit to bed {bed.label} <span className="font-normal text-ink-muted">· {unit.name}</span>
      </h1>
      <PatientFields form={form} />
      <CareFields form={form} orders={NO_DETAILS.orders} />
      <AdmittedAtFields
        admitted={admitted}
        today={dayIn(serverNow(), unit.timeZone)}
        fault={fault}
        onChange={setAdmitted}
      />
      {oddHeight && (
        <OddHeight heightCm={oddHeight.heightCm} isKept={oddHeight.isKept} onKeep={oddHeight.keep} />
      )}
      <WriteFault error={admit.error} />
      <div className="flex flex-wrap gap-3">
        <Button type="submit" tone="main" disabled={admit.isPending}>
          {admit.isPending ? 'Sending …' : `Admit to bed ${bed.label}`}
        </Button>
        <Button onClick={() => void navigate(`/round/${bed.unitId}`)}>Not now</Button>
      </div>
    </form>
  );
}
