/** What this screen is and is not, what its units are, and the key to its three signs of age. */
export function BoardFooter({ demonstration }: { demonstration: boolean }) {
  return (
    <footer className="flex h-11 shrink-0 items-center gap-6 text-note-line leading-tight text-ink-muted">
      <p className="flex-1">
        Information display. Not a monitor, not an alarm. Verify at the bedside. Local policy and licensed
        practice first.
        <br />
        Times show when observed. Pressures in cmH2O, gases in mmHg, rates per minute.
      </p>
      {demonstration && (
        <p className="rounded-md border-2 border-note px-2 font-bold text-note">demonstration data</p>
      )}
      <ul aria-label="Key to ages" className="flex items-center gap-4">
        <li className="flex items-center gap-2">
          <span className="key-due" aria-hidden="true" />
          due
        </li>
        <li className="flex items-center gap-2">
          <span className="key-rake rake-wide" aria-hidden="true" />
          overdue
        </li>
        <li className="flex items-center gap-2">
          <span className="key-rake rake-dense" aria-hidden="true" />
          withdrawn
        </li>
      </ul>
    </footer>
  );
}
