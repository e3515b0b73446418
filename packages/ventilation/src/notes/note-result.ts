/** What a calculation gives, as its `@returns` tells it. */
export type NoteResult = {
  /** The unit of a number; empty where the number has none, or the result is no number. */
  unit: string;
  /** The whole text. */
  words: string;
  /** The parts of a record, by their keys. */
  parts: readonly { key: string; label: string; unit: string }[];
};

/** These begin a text that has no unit. */
const WITHOUT_UNIT = /^(index|ratio|class|record|list|state|value)\b/;
const PART = /`(?!null\b)(\w+)` ([^;`]+?)(?=[;.]|$)/g;

export function noteResult(text: string): NoteResult {
  const unit = WITHOUT_UNIT.test(text) ? '' : (/^.+?(?=[,;]|\.$|\. )/.exec(text)?.[0] ?? text);
  const isRecord = text.startsWith('record: ');
  return { unit, words: text, parts: isRecord ? [...text.matchAll(PART)].map(partOf) : [] };
}

function partOf([, key = '', said = '']: RegExpExecArray) {
  const comma = said.lastIndexOf(', ');
  return comma < 0
    ? { key, label: said, unit: '' }
    : { key, label: said.slice(0, comma), unit: said.slice(comma + 2) };
}
