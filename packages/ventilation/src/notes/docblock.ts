/** The comment above a calculation, taken apart into its tags. */
export type Docblock = {
  /** The function right below it. */
  name: string;
  /** What stands before the first tag. */
  text: string;
  tags: readonly { tag: string; text: string }[];
};

/** Any comment of the file that stands right above an exported function; only a calculation's has a formula. */
const ABOVE_FUNCTION = /\/\*\*((?:(?!\*\/)[\s\S])*)\*\/\s*export function (\w+)/g;

/**
 * The docblock of a file's calculation. Lines that belong together are joined, so that wrapping means nothing.
 *
 * @throws Error where the file has no calculation with a `@formula`.
 */
export function docblockIn(source: string): Docblock {
  for (const [, comment = '', name = ''] of source.matchAll(ABOVE_FUNCTION)) {
    if (comment.includes('@formula ')) return { name, ...partsOf(comment) };
  }
  throw new Error('no docblock with a @formula stands above an exported function');
}

function partsOf(comment: string): Omit<Docblock, 'name'> {
  const lines = comment.split('\n').map((line) => line.replace(/^\s*\*? ?/, '').trimEnd());
  const [text = '', ...tagged] = lines.join('\n').split(/^@/m).map(joined);
  const tags = tagged.map((part) => {
    const end = part.indexOf(' ');
    return end < 0 ? { tag: part, text: '' } : { tag: part.slice(0, end), text: part.slice(end + 1) };
  });
  return { text, tags };
}

function joined(text: string): string {
  return text.replace(/\s+/g, ' ').trim();
}
