/** On every page: what this is not. */
export function ShellFooter({ isDemonstration }: { isDemonstration: boolean }) {
  return (
    <footer className="flex flex-wrap items-center justify-between gap-x-6 gap-y-1 px-5 py-2 text-ink-muted text-sm">
      <p>Information display. Not a monitor, not an alarm, not an order. Verify at the bedside.</p>
      {isDemonstration && <p className="font-bold text-ink">Demonstration data: no real patients</p>}
    </footer>
  );
}
