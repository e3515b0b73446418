import { Button } from '@windrow/ui/controls/button';
import { ChoiceGroup } from '@windrow/ui/controls/choice-group';
import { FieldError } from '@windrow/ui/controls/field-frame';
import { TextArea, TextField } from '@windrow/ui/controls/text-field';
import type { NoteArgument } from '@windrow/ventilation/notes/note-argument';
import { useId, useState } from 'react';
import { acceptedWords, firstCapital } from './argument-words.ts';
import type { Runnable } from './note-sources.ts';
import { ResultView } from './result-view.tsx';
import { runNote, type Texts } from './run-note.ts';

type RunFormProps = Pick<Runnable, 'note' | 'calculation'> & {
  opening: Texts;
  /** It was opened from a value, with the numbers that made it. */
  isFilled: boolean;
};

/** The calculation itself on any numbers, worked out at each key; what it refuses is told at the field. */
export function RunForm({ note, calculation, opening, isFilled }: RunFormProps) {
  const id = useId();
  const [texts, setTexts] = useState(opening);
  const outcome = runNote({ note, calculation, texts });
  const isChanged = note.arguments.some(({ key }) => texts[key] !== opening[key]);
  return (
    <section aria-labelledby={id} className="flex min-w-0 flex-col gap-4 rounded-xl bg-tile p-4">
      <div>
        <h2 id={id} className="font-bold text-lg">
          Run it on your own numbers
        </h2>
        <p className="text-ink-muted">
          {isFilled
            ? 'It opened with the numbers that made the value. Nothing here is recorded.'
            : 'Nothing here is recorded.'}
        </p>
      </div>
      <div className="grid gap-4 sm:grid-cols-2">
        {note.arguments.map((argument) => (
          <ArgumentField
            key={argument.key}
            argument={argument}
            text={texts[argument.key] ?? ''}
            error={outcome.state === 'refused' && outcome.key === argument.key ? outcome.message : undefined}
            onText={(text) => setTexts({ ...texts, [argument.key]: text })}
          />
        ))}
      </div>
      {outcome.state === 'refused' && outcome.key === null && <FieldError>{outcome.message}</FieldError>}
      <ResultView note={note} outcome={outcome} />
      {isChanged && (
        <div>
          <Button tone="quiet" onClick={() => setTexts(opening)}>
            {isFilled ? 'Back to the numbers of the value' : 'Start again'}
          </Button>
        </div>
      )}
    </section>
  );
}

type ArgumentFieldProps = {
  argument: NoteArgument;
  text: string;
  error: string | undefined;
  onText: (text: string) => void;
};

function ArgumentField({ argument, text, error, onText }: ArgumentFieldProps) {
  const label = firstCapital(argument.label);
  // The key stands there too: the calculation refuses in its own words, which name it.
  const hint = [argument.key, acceptedWords(argument), argument.words.replaceAll('`', '')]
    .filter(Boolean)
    .join(' · ');
  const words = { label, hint, error };
  switch (argument.kind) {
    case 'number':
      return (
        <TextField
          {...words}
          inputMode="decimal"
          value={text}
          onChange={(event) => onText(event.target.value)}
        />
      );
    case 'text':
      return <TextField {...words} value={text} onChange={(event) => onText(event.target.value)} />;
    case 'json':
      return (
        <div className="sm:col-span-2">
          <TextArea
            {...words}
            rows={Math.min(12, text.split('\n').length + 1)}
            spellCheck={false}
            value={text}
            onChange={(event) => onText(event.target.value)}
          />
        </div>
      );
    case 'choice':
    case 'yes-no':
      return (
        <ChoiceGroup
          label={label}
          options={optionsOf(argument)}
          value={text === '' ? null : text}
          onChoose={onText}
          error={error}
        />
      );
  }
}

function optionsOf(argument: NoteArgument) {
  if (argument.kind !== 'choice') {
    return [
      { value: 'true', label: 'Yes' },
      { value: 'false', label: 'No' },
    ];
  }
  return argument.options.map((value) => ({ value, label: value }));
}
