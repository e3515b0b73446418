import { newKey } from '../new-key.ts';

/**
 * The key of one act. It belongs to the very words that are sent: sent again they keep their key and are
 * recorded once; changed words are another act.
 */
export function actKeys(): (body: unknown) => string {
  let last: { text: string; key: string } | null = null;
  return (body) => {
    const text = JSON.stringify(body);
    if (last?.text !== text) last = { text, key: newKey() };
    return last.key;
  };
}
