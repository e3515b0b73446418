import { useQuery } from '@tanstack/react-query';
import { ReadFault } from '@windrow/ui/controls/faults';
import { EmptyState, LoadingState } from '@windrow/ui/controls/states';
import { TextField } from '@windrow/ui/controls/text-field';
import type { MethodNote } from '@windrow/ventilation/notes/parse-docblock';
import { useId, useState } from 'react';
import { Link } from 'react-router-dom';
import { allNotesQuery } from './note-sources.ts';
import { type Subject, subjectsOf } from './subjects.ts';
import { Ticked } from './ticked.tsx';

/** Everything that Windrow works out, by subject. */
export function NotesPage() {
  const notes = useQuery(allNotesQuery());
  const [search, setSearch] = useState('');
  if (notes.isPending) return <LoadingState what="the method notes" />;
  if (!notes.data) {
    return <ReadFault error={notes.error} what="The method notes" onRetry={() => void notes.refetch()} />;
  }
  const subjects = subjectsOf({ listed: notes.data, search });
  const count = subjects.reduce((sum, subject) => sum + subject.notes.length, 0);
  return (
    <div className="mx-auto flex w-full max-w-7xl flex-col gap-4">
      <div className="flex flex-wrap items-end justify-between gap-x-6 gap-y-2">
        <div>
          <h1 className="font-bold text-2xl">Method notes</h1>
          <p className="text-ink-muted">
            How each value is worked out, where that holds and where it is from, read from the code itself.
          </p>
        </div>
        <div className="w-full sm:w-72">
          <TextField
            type="search"
            label="Search the notes"
            value={search}
            onChange={(event) => setSearch(event.target.value)}
          />
        </div>
      </div>
      <p role="status" className="sr-only">
        {count} {count === 1 ? 'note' : 'notes'}
      </p>
      {subjects.length === 0 && (
        <EmptyState title={`No note has “${search.trim()}” in it`}>
          <p>Titles, formulas, inputs and sources are searched.</p>
        </EmptyState>
      )}
      {subjects.map((subject) => (
        <SubjectList key={subject.title} subject={subject} />
      ))}
    </div>
  );
}

function SubjectList({ subject: { title, notes } }: { subject: Subject }) {
  const id = useId();
  return (
    <section aria-labelledby={id} className="flex flex-col gap-2">
      <h2 id={id} className="font-bold text-ink-muted text-lg">
        {title}
      </h2>
      <ul className="grid gap-2 md:grid-cols-2">
        {notes.map((note) => (
          <li key={note.name}>
            <NoteLink note={note} />
          </li>
        ))}
      </ul>
    </section>
  );
}

function NoteLink({ note }: { note: MethodNote }) {
  return (
    <Link
      to={`/notes/${note.name}`}
      className="flex h-full min-h-12 flex-col rounded-xl bg-tile px-4 py-3 text-ink no-underline"
    >
      <span className="font-bold underline">{note.title}</span>
      <span className="text-ink-muted">
        <Ticked>{note.meaning}</Ticked>
      </span>
    </Link>
  );
}
