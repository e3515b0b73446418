import { zodResolver } from '@hookform/resolvers/zod';
import { useMutation, useQueryClient } from '@tanstack/react-query';
import { policyKey, policyPath, policyQuery } from '@windrow/client/board/policy-query';
import { write } from '@windrow/client/writes/write';
import { announce } from '@windrow/ui/controls/notice-host';
import { PolicyChange, type PolicyVersion } from '@windrow/ventilation/contract/setup';
import { useState } from 'react';
import { useForm, useWatch } from 'react-hook-form';
import { isStale, numberWords } from '../form-words.ts';
import { policyDifferences, policyOnTop } from './policy-merge.ts';

/**
 * A policy while it is changed. A newer version replaces a form without changes at once; one with changes
 * is only told of it, and then takes theirs or is put on top.
 */
export function usePolicyForm(latest: PolicyVersion) {
  const { unitId } = latest;
  const queryClient = useQueryClient();
  const [base, setBase] = useState(latest);
  const form = useForm({
    resolver: zodResolver(PolicyChange, { error: numberWords }),
    defaultValues: { policy: base.policy, reason: '' },
  });
  const [policy, reason] = useWatch({ control: form.control, name: ['policy', 'reason'] });
  const changes = policyDifferences({ theirs: base.policy, mine: policy });

  function begin(version: PolicyVersion, values: PolicyChange): void {
    setBase(version);
    form.reset(values);
  }

  const mutation = useMutation({
    mutationFn: (body: PolicyChange) =>
      write<PolicyVersion>({ method: 'PUT', path: policyPath(unitId), body, ifMatch: base.version }),
    onSuccess: (answer) => {
      queryClient.setQueryData(policyKey(unitId), answer);
      begin(answer, { policy: answer.policy, reason: '' });
      announce(`Version ${answer.version} of the policy holds from now on.`);
    },
    onError: (error) => {
      if (isStale(error)) void queryClient.fetchQuery({ ...policyQuery(unitId), staleTime: 0 });
    },
  });

  const isNewer = latest.version > base.version;
  return {
    form,
    base,
    changes,
    newer: isNewer && changes.length > 0 ? latest : null,
    /** To be taken over in an effect: nothing of this form would be lost. */
    replacement: isNewer && changes.length === 0 ? latest : null,
    mine: policy,
    save: form.handleSubmit((body) => mutation.mutate(body)),
    isSaving: mutation.isPending,
    error: mutation.error && !isStale(mutation.error) ? mutation.error : null,
    discard: () => begin(base, { policy: base.policy, reason: '' }),
    takeTheirs: (theirs: PolicyVersion) => {
      mutation.reset();
      begin(theirs, { policy: theirs.policy, reason: '' });
    },
    putOnTop: (theirs: PolicyVersion) => {
      mutation.reset();
      begin(theirs, {
        policy: policyOnTop({ base: base.policy, mine: policy, theirs: theirs.policy }),
        reason,
      });
    },
  };
}
export type PolicyEditing = ReturnType<typeof usePolicyForm>;
