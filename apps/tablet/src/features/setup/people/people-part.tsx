import { useQuery } from '@tanstack/react-query';
import { Button } from '@windrow/ui/controls/button';
import { Reading } from '@windrow/ui/controls/reading';
import { EmptyState } from '@windrow/ui/controls/states';
import { TextField } from '@windrow/ui/controls/text-field';
import type { Unit } from '@windrow/ventilation/contract/board';
import type { Person } from '@windrow/ventilation/contract/setup';
import { useState } from 'react';
import { peopleQuery } from '../setup-queries.ts';
import { NewPersonDialog } from './new-person-dialog.tsx';
import { PersonDialog } from './person-dialog.tsx';
import { grantsInWords } from './role-words.ts';

/** Everybody who may sign in, and with which roles. */
export function PeoplePart({ units }: { units: readonly Unit[] }) {
  const people = useQuery(peopleQuery());
  return (
    <Reading asked={people} what="the people">
      {(all) => <People people={all} units={units} />}
    </Reading>
  );
}

function People({ people, units }: { people: readonly Person[]; units: readonly Unit[] }) {
  const [search, setSearch] = useState('');
  const [openId, setOpenId] = useState<string | null>(null);
  const [adding, setAdding] = useState(false);
  const wanted = search.trim().toLowerCase();
  const shown = people.filter(({ displayName, username }) =>
    `${displayName} ${username}`.toLowerCase().includes(wanted),
  );
  const open = people.find(({ personId }) => personId === openId) ?? null;

  return (
    <section aria-labelledby="people" className="flex flex-col gap-3">
      <div className="flex flex-wrap items-end justify-between gap-3">
        <h2 id="people" className="font-bold text-xl">
          {shown.length} of {people.length} people
        </h2>
        <div className="flex flex-wrap items-end gap-3">
          <TextField
            label="Name or user name"
            type="search"
            value={search}
            onChange={(event) => setSearch(event.target.value)}
          />
          <Button onClick={() => setAdding(true)}>Add a person</Button>
        </div>
      </div>
      {shown.length === 0 && <EmptyState title="Nobody is called so" />}
      {shown.length > 0 && (
        <ul className="flex flex-col overflow-hidden rounded-xl bg-tile">
          {shown.map((person) => (
            <li key={person.personId} className="border-line border-b last:border-b-0">
              <PersonLine person={person} units={units} onPress={() => setOpenId(person.personId)} />
            </li>
          ))}
        </ul>
      )}
      {open && <PersonDialog person={open} units={units} onClose={() => setOpenId(null)} />}
      {adding && <NewPersonDialog units={units} onClose={() => setAdding(false)} />}
    </section>
  );
}

function PersonLine({
  person,
  units,
  onPress,
}: {
  person: Person;
  units: readonly Unit[];
  onPress: () => void;
}) {
  return (
    <button
      type="button"
      onClick={onPress}
      className="grid min-h-14 w-full items-center gap-x-4 gap-y-1 px-4 py-2 text-left -outline-offset-2 md:grid-cols-[18rem_1fr_auto]"
    >
      <span className="flex min-w-0 items-center gap-3">
        <span aria-hidden="true" className="rounded-md border-2 border-line px-2 py-1 font-bold">
          {person.initials}
        </span>
        <span className="min-w-0">
          <span className="block break-words font-bold">{person.displayName}</span>
          <span className="block text-ink-muted text-sm">{person.username}</span>
        </span>
      </span>
      <span>{grantsInWords(person.grants, units)}</span>
      {person.disabled && <span className="font-bold">may not sign in</span>}
    </button>
  );
}
