import type { MethodNote } from '@windrow/ventilation/notes/parse-docblock';
import { resultLines } from './result-lines.ts';
import type { Outcome } from './run-note.ts';
import { Ticked } from './ticked.tsx';

/** What comes out, unrounded; said again to those who listen when it changes. */
export function ResultView({ note, outcome }: { note: MethodNote; outcome: Outcome }) {
  return (
    <div role="status" aria-label="Result" className="rounded-lg border-2 border-ink px-4 py-3">
      {outcome.state === 'result' ? (
        <Result note={note} value={outcome.value} />
      ) : (
        <p className="text-ink-muted">
          {outcome.state === 'wanting' ? outcome.message : 'No result from these numbers.'}
        </p>
      )}
    </div>
  );
}

function Result({ note, value }: { note: MethodNote; value: unknown }) {
  const lines = resultLines({ result: note.result, value });
  return (
    <>
      <dl className="flex flex-col gap-1">
        {lines.map(({ label, value: text, unit }) => (
          <div key={label ?? 'result'} className="flex flex-wrap items-baseline justify-between gap-x-4">
            <dt className="text-ink-muted">{label ?? note.title}</dt>
            <dd className="wrap-anywhere">
              <span className={`font-bold tabular-nums ${label === null ? 'text-2xl' : 'text-xl'}`}>
                {text}
              </span>
              {unit && <span className="text-ink-muted"> {unit}</span>}
            </dd>
          </div>
        ))}
      </dl>
      <p className="mt-1 text-ink-muted text-sm">
        {value === null && <Ticked>{note.result.words}</Ticked>}
        {typeof value === 'number' && 'Unrounded; the screens round it.'}
      </p>
    </>
  );
}
