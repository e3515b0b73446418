import { useQuery } from '@tanstack/react-query';
import { Button, buttonClass } from '@windrow/ui/controls/button';
import { ReadFault } from '@windrow/ui/controls/faults';
import { EmptyState, LoadingState } from '@windrow/ui/controls/states';
import { Link, useLocation, useNavigate, useParams, useSearchParams } from 'react-router-dom';
import { NoteFacts } from './note-facts.tsx';
import { noteQuery } from './note-sources.ts';
import { RunForm } from './run-form.tsx';
import { openingTexts } from './run-note.ts';
import { Ticked } from './ticked.tsx';

/** One calculation: what it means, how it goes, and the calculation itself on any numbers. */
export function NotePage() {
  const { name = '' } = useParams();
  const [query] = useSearchParams();
  const read = useQuery(noteQuery(name));
  if (read.isPending) return <LoadingState what="the method note" />;
  if (read.isError) {
    return <ReadFault error={read.error} what="The method note" onRetry={() => void read.refetch()} />;
  }
  if (read.data === null) {
    return (
      <EmptyState title={`There is no method note “${name}”`}>
        <Link to="/notes" className={buttonClass()}>
          All method notes
        </Link>
      </EmptyState>
    );
  }
  const { note, code, calculation } = read.data;
  const opening = openingTexts({ note, query });
  return (
    <article className="mx-auto flex w-full max-w-7xl flex-col gap-4">
      <div className="flex flex-wrap items-start gap-x-6 gap-y-2">
        <div className="min-w-0 grow basis-72">
          <h1 className="font-bold text-2xl">{note.title}</h1>
          <p className="text-lg">
            <Ticked>{note.meaning}</Ticked>
          </p>
        </div>
        <WaysOut />
      </div>
      <div className="grid items-start gap-4 lg:grid-cols-2">
        <RunForm
          key={`${name}?${query.toString()}`}
          note={note}
          calculation={calculation}
          opening={opening}
          isFilled={note.arguments.some(({ key }) => query.has(key))}
        />
        <NoteFacts note={note} code={code} />
      </div>
    </article>
  );
}

/** Back to the value that the note was opened from; what was half filled in there is kept. */
function WaysOut() {
  const { key } = useLocation();
  const navigate = useNavigate();
  // The first page of a visit has nothing behind it.
  const cameFromHere = key !== 'default';
  return (
    <nav aria-label="Ways out of the note" className="flex gap-2">
      {cameFromHere && <Button onClick={() => void navigate(-1)}>Back</Button>}
      <Link to="/notes" className={buttonClass('quiet')}>
        All method notes
      </Link>
    </nav>
  );
}
