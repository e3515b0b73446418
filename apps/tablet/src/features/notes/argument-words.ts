import type { NoteArgument } from '@windrow/ventilation/notes/note-argument';

/** What a calculation accepts of an argument: "1 to 3000 mL". */
export function acceptedWords(argument: NoteArgument): string {
  switch (argument.kind) {
    case 'number': {
      const [low, high] = argument.range;
      return `${low} to ${high}${argument.unit ? ` ${argument.unit}` : ''}`;
    }
    case 'choice':
      return argument.options.join(', ');
    case 'yes-no':
      return 'yes or no';
    case 'text':
      return 'text';
    case 'json':
      return 'as JSON';
  }
}

/** "pH" and "cmH2O" keep their first letter: it means something. */
export function firstCapital(words: string): string {
  return /^[a-z][a-z\s,;:’'–-]/.test(words) ? `${words.slice(0, 1).toUpperCase()}${words.slice(1)}` : words;
}
