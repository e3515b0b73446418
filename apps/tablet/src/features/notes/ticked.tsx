/** Words in which what stands between back-ticks is set off, as it is written in the code. */
export function Ticked({ children }: { children: string }) {
  return children.split('`').map((part, at) =>
    at % 2 === 0 ? (
      part
    ) : (
      // The parts of a text have no other name than their place in it.
      // biome-ignore lint/suspicious/noArrayIndexKey: the text of a note does not change
      <code key={at} className="font-bold font-sans">
        {part}
      </code>
    ),
  );
}
