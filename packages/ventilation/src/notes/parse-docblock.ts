import { type Docblock, docblockIn } from './docblock.ts';
import { type NoteArgument, noteArgument } from './note-argument.ts';
import { type NoteResult, noteResult } from './note-result.ts';

/** A calculation as a person reads about it; everything in it stands above the function in the code. */
export type MethodNote = {
  name: string;
  title: string;
  meaning: string;
  formula: string;
  validity: string;
  arguments: readonly NoteArgument[];
  /** Called with one number alone, instead of a record of keys. */
  isBare: boolean;
  result: NoteResult;
  errors: string;
  sources: readonly string[];
  /** An input that can be run: always there where an argument is more than a number or a word. */
  example: Readonly<Record<string, unknown>> | null;
};

/**
 * Reads the method note out of a calculation's own source, so that the two cannot drift apart. Strict: what
 * cannot be read is an error, and a test reads every exported calculation.
 *
 * @param source the text of the file that holds the calculation.
 * @throws Error naming the calculation and what is missing or cannot be read.
 */
export function parseDocblock(source: string): MethodNote {
  const docblock = docblockIn(source);
  try {
    return noteOf(docblock);
  } catch (error) {
    throw new Error(`${docblock.name}: ${error instanceof Error ? error.message : String(error)}`);
  }
}

function noteOf(docblock: Docblock): MethodNote {
  const { name, text } = docblock;
  if (text === '') throw new Error('the docblock does not begin with what the calculation means');
  const parameters = textsOf(docblock, 'param').map(parameterOf);
  const example = exampleOf(textsOf(docblock, 'example')[0]);
  const read = parameters.map(({ key, said }) => noteArgument(key, said));
  const needsExample = read.filter(({ kind }) => kind === 'json' || kind === 'text');
  for (const { key } of needsExample) {
    if (!(example && key in example)) throw new Error(`@example gives no ${key}`);
  }
  return {
    name,
    title: only(docblock, 'title'),
    meaning: text,
    formula: only(docblock, 'formula').replace(/\.$/, ''),
    validity: only(docblock, 'valid'),
    arguments: read,
    isBare: parameters.length === 1 && parameters[0]?.isBare === true,
    result: noteResult(only(docblock, 'returns')),
    errors: only(docblock, 'throws'),
    sources: atLeastOne(docblock, 'source'),
    example,
  };
}

function parameterOf(text: string) {
  const [, input, key, said] = /^(input\.)?(\w+) (.+)$/.exec(text) ?? [];
  if (key === undefined || said === undefined) throw new Error(`@param cannot be read: ${text}`);
  return { key, said, isBare: input === undefined };
}

function exampleOf(text: string | undefined): MethodNote['example'] {
  if (text === undefined) return null;
  const example: unknown = JSON.parse(text);
  if (typeof example !== 'object' || example === null) throw new Error('@example must be an input as JSON');
  return Object.fromEntries(Object.entries(example));
}

function textsOf({ tags }: Docblock, wanted: string): string[] {
  return tags.filter(({ tag, text }) => tag === wanted && text !== '').map(({ text }) => text);
}

function atLeastOne(docblock: Docblock, wanted: string): string[] {
  const texts = textsOf(docblock, wanted);
  if (texts.length === 0) throw new Error(`the docblock has no @${wanted}`);
  return texts;
}

function only(docblock: Docblock, wanted: string): string {
  const [text = '', ...more] = atLeastOne(docblock, wanted);
  if (more.length > 0) throw new Error(`the docblock has @${wanted} more than once`);
  return text;
}
