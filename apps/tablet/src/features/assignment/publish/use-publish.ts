import { useMutation, useQueryClient } from '@tanstack/react-query';
import { ProblemError } from '@windrow/client/http';
import { newKey } from '@windrow/client/new-key';
import { write } from '@windrow/client/writes/write';
import { loads, nobodyHas } from '@windrow/ventilation/assignment/loads';
import type { Assignment, AssignmentInput } from '@windrow/ventilation/contract/shifts';
import { useRef } from 'react';
import type { AssignmentDraft } from '../draft/use-assignment-draft.ts';
import { assignmentKey, assignmentPath, assignmentQuery, shiftsKey } from '../shift-queries.ts';

type Attempt = { body: AssignmentInput; ifMatch: number; key: string };

/**
 * Sends a draft, published or only kept. Where somebody was faster, the newest is read, and the draft then
 * offers it: nothing of either is lost.
 */
export function usePublish({ assignment, draft }: { assignment: Assignment; draft: AssignmentDraft }) {
  const queryClient = useQueryClient();
  const { shift } = assignment;
  const attempt = useRef<Attempt | null>(null);

  const mutation = useMutation({
    mutationFn: ({ body, ifMatch, key }: Attempt) =>
      write<Assignment>({ method: 'PUT', path: assignmentPath(shift.shiftId), body, ifMatch, key }),
    onSuccess: (answer) => {
      draft.markSaved(answer);
      queryClient.setQueryData(assignmentKey(shift), answer);
      void queryClient.invalidateQueries({ queryKey: shiftsKey(shift.unitId), exact: true });
    },
    onError: (error) => {
      if (isStale(error)) void readNewest();
    },
  });

  function readNewest(): Promise<Assignment> {
    return queryClient.fetchQuery({ ...assignmentQuery(shift), staleTime: 0 });
  }

  function send(publish: boolean): void {
    const body: AssignmentInput = { places: placesToSend({ assignment, draft }), publish };
    const ifMatch = draft.base.version;
    // After a lost network the first try may have arrived: the same content goes under the same key.
    const before = attempt.current;
    const isSame =
      before !== null && before.ifMatch === ifMatch && JSON.stringify(before.body) === JSON.stringify(body);
    attempt.current = { body, ifMatch, key: isSame ? before.key : newKey() };
    mutation.mutate(attempt.current);
  }

  return {
    send,
    readNewest,
    isSending: mutation.isPending,
    wasPublishing: mutation.variables?.body.publish ?? false,
    /** Why the last try failed, where the newer version does not say so itself. */
    error: mutation.error && !isStale(mutation.error) ? mutation.error : null,
    wasStale: mutation.error !== null && isStale(mutation.error),
    forget: mutation.reset,
  };
}
export type Publishing = ReturnType<typeof usePublish>;

/** Only people of the shift can have beds; a bed of somebody else is shown with nobody, and so it is sent. */
function placesToSend({ assignment, draft }: { assignment: Assignment; draft: AssignmentDraft }) {
  const onShift = new Set(assignment.shift.people.map(({ personId }) => personId));
  return draft.places
    .filter(({ personId }) => onShift.has(personId))
    .map(({ bedId, personId, coverPersonId }) => ({ bedId, personId, coverPersonId: coverPersonId ?? null }));
}

/** What is worth asking about before every screen shows it. */
export function doubtsOf(input: {
  assignment: Assignment;
  draft: AssignmentDraft;
  minutesByBed: ReadonlyMap<string, number>;
  labelOf: (bedId: string) => string;
}): string[] {
  const { people } = input.assignment.shift;
  const of = { people, places: input.draft.places, minutesByBed: input.minutesByBed };
  const loose = nobodyHas(of).map(input.labelOf);
  const over = loads(of).filter((load) => load.over > 0);
  return [
    ...(loose.length > 0 ? [`Nobody has ${loose.length === 1 ? 'bed' : 'beds'} ${loose.join(', ')}.`] : []),
    ...over.map((load) => `${load.person.displayName} is ${Math.round(load.over)} min over.`),
  ];
}

function isStale(error: unknown): boolean {
  return error instanceof ProblemError && error.problem.type.endsWith(':stale-version');
}
