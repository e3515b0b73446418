const PARTS: Readonly<Record<string, string>> = {
  round: 'Round',
  beds: 'Bed',
  admit: 'Admit',
  assignment: 'Assignment',
  capacity: 'Capacity',
  setup: 'Setup',
};

/** What the browser's tab and history say. Never a name: others see the tabs of a shared device. */
export function pageTitle({ pathname, unitName }: { pathname: string; unitName: string | null }): string {
  const part = PARTS[pathname.split('/')[1] ?? ''];
  return [part, part === undefined ? null : unitName, 'Windrow'].filter(Boolean).join(' · ');
}
