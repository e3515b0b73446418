import { useQueryClient } from '@tanstack/react-query';
import { SESSION_KEY, signOut } from '@windrow/client/session/session';
import type { Unit } from '@windrow/ventilation/contract/board';
import { Button } from '../messages/button.tsx';
import { Message } from '../messages/message.tsx';
import { showUnit } from './address.ts';

const LOOK =
  'flex min-h-16 w-full items-baseline justify-between gap-6 rounded-lg border-2 border-line-strong bg-tile px-6 py-4 text-left';

/** Which unit this screen shows. The answer is kept in the address, so a display can be set to start with it. */
export function UnitChooser({ units, asked }: { units: readonly Unit[]; asked: string | null }) {
  const queryClient = useQueryClient();
  const handleSignOut = () => {
    const forget = () => queryClient.setQueryData(SESSION_KEY, null);
    // Without an answer the session may still stand; saying otherwise would be untrue.
    signOut().then(forget, () => void queryClient.invalidateQueries({ queryKey: SESSION_KEY }));
  };
  return (
    <Message
      title={units.length === 0 ? 'No unit to show' : 'Which unit?'}
      sentence={sentenceOf(units, asked)}
    >
      <ul className="flex flex-col gap-3">
        {units.map(({ unitId, name, bedCount }) => (
          <li key={unitId}>
            <button type="button" className={LOOK} onClick={() => showUnit(unitId)}>
              <span className="font-bold">{name}</span>
              <span className="text-label text-ink-muted">{bedCount} beds</span>
            </button>
          </li>
        ))}
      </ul>
      <div>
        <Button onPress={handleSignOut}>Sign out</Button>
      </div>
    </Message>
  );
}

function sentenceOf(units: readonly Unit[], asked: string | null): string {
  if (units.length === 0) return 'This account may see no unit. An administrator can change that.';
  if (asked !== null) return 'The unit in the address is not one that this account may see.';
  return 'The choice is kept in the address of this page.';
}
