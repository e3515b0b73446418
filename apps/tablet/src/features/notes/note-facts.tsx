import type { NoteArgument } from '@windrow/ventilation/notes/note-argument';
import type { MethodNote } from '@windrow/ventilation/notes/parse-docblock';
import { type ReactNode, useId } from 'react';
import { acceptedWords, firstCapital } from './argument-words.ts';
import { Ticked } from './ticked.tsx';

/** What is written above the calculation in the code, in the words of the code. */
export function NoteFacts({ note, code }: { note: MethodNote; code: string }) {
  return (
    <div className="flex min-w-0 flex-col gap-4 rounded-xl bg-tile p-4">
      <Part title="Formula">
        <p className="wrap-break-word text-lg">
          <Ticked>{note.formula}</Ticked>
        </p>
      </Part>
      <Part title="Where it is valid">
        <p>
          <Ticked>{firstCapital(note.validity)}</Ticked>
        </p>
      </Part>
      <Part title="Inputs">
        <dl className="flex flex-col gap-2">
          {note.arguments.map((argument) => (
            <Input key={argument.key} argument={argument} />
          ))}
        </dl>
      </Part>
      <Part title="Result">
        <p>
          {/* A unit keeps its first letter. */}
          <Ticked>{note.result.unit ? note.result.words : firstCapital(note.result.words)}</Ticked>
        </p>
        <p className="text-ink-muted">
          <Ticked>{note.errors}</Ticked>
        </p>
      </Part>
      <Part title={note.sources.length === 1 ? 'Source' : 'Sources'}>
        {note.sources.map((source) => (
          <p key={source}>{firstCapital(source)}</p>
        ))}
      </Part>
      <details>
        <summary className="flex min-h-12 w-fit cursor-pointer items-center font-bold underline">
          The code itself
        </summary>
        <pre className="wrap-anywhere whitespace-pre-wrap text-sm">{code}</pre>
      </details>
    </div>
  );
}

function Input({ argument }: { argument: NoteArgument }) {
  return (
    <div>
      <dt className="font-bold">{firstCapital(argument.label)}</dt>
      <dd className="text-ink-muted">
        <Ticked>
          {[`\`${argument.key}\`: ${acceptedWords(argument)}`, argument.words].filter(Boolean).join('; ')}
        </Ticked>
      </dd>
    </div>
  );
}

function Part({ title, children }: { title: string; children: ReactNode }) {
  const id = useId();
  return (
    <section aria-labelledby={id} className="flex flex-col gap-1">
      <h2 id={id} className="font-bold text-ink-muted">
        {title}
      </h2>
      {children}
    </section>
  );
}
