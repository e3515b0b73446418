import { useNow } from '@windrow/client/clock/use-now';
import { announce } from '@windrow/ui/controls/notice-host';
import { loads } from '@windrow/ventilation/assignment/loads';
import { coverBed, differences, giveBed, holderOf } from '@windrow/ventilation/assignment/places';
import { shiftMinutes } from '@windrow/ventilation/assignment/shift-span';
import type { Bed } from '@windrow/ventilation/contract/board';
import type { Assignment } from '@windrow/ventilation/contract/shifts';
import type { Policy } from '@windrow/ventilation/policy/policy';
import type { Choice } from './bed-dialog.tsx';
import { workOf } from './bed-work.ts';
import { useAssignmentDraft } from './draft/use-assignment-draft.ts';
import { doubtsOf, usePublish } from './publish/use-publish.ts';

const MINUTE_MS = 60_000;

/** One shift's assignment while it is worked on: beds weighed, the draft, and what can be done to it. */
export function useDesk({
  assignment,
  beds,
  policy,
}: {
  assignment: Assignment;
  beds: readonly Bed[];
  policy: Policy;
}) {
  const now = useNow(MINUTE_MS);
  const { shift } = assignment;
  const { people } = shift;
  const { work, empty } = workOf({
    beds,
    policy,
    shiftMinutes: shiftMinutes(shift),
    shiftId: shift.shiftId,
    now,
  });
  const minutesByBed = new Map(work.map(({ bedId, minutes }) => [bedId, minutes.total]));
  const draft = useAssignmentDraft(assignment);
  const publishing = usePublish({ assignment, draft });
  const labelOf = (bedId: string) => beds.find((bed) => bed.bedId === bedId)?.label ?? 'gone';

  return {
    now,
    people,
    work,
    empty,
    draft,
    publishing,
    labelOf,
    isPublished: assignment.publishedVersion === draft.base.version,
    changedCount: differences({ theirs: draft.base.places, mine: draft.places }).length,
    doubts: doubtsOf({ assignment, draft, minutesByBed, labelOf }),
    holderOf: (bedId: string) => holderOf(draft.places, bedId),
    coverOf: (bedId: string) => draft.places.find((place) => place.bedId === bedId)?.coverPersonId ?? null,
    give: (bedId: string, personId: string | null) => draft.move(giveBed(draft.places, bedId, personId)),
    cover: (bedId: string, personId: string | null) => draft.move(coverBed(draft.places, bedId, personId)),
    announceGiven: (bedId: string, personId: string | null) => {
      const name = people.find((person) => person.personId === personId)?.displayName ?? 'nobody';
      announce(`Bed ${labelOf(bedId)} is now with ${name}.`);
    },
    /** Each person with the load that they would have with this bed. */
    choicesFor: (bedId: string): Choice[] =>
      people.flatMap(({ personId }) => {
        const would = loads({ people, places: giveBed(draft.places, bedId, personId), minutesByBed });
        const load = would.find(({ person }) => person.personId === personId);
        return load ? [{ load, isHolder: holderOf(draft.places, bedId) === personId }] : [];
      }),
  };
}
export type Desk = ReturnType<typeof useDesk>;
