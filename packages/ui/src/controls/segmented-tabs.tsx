import type { ReactNode } from 'react';

/** The look of one tab among several; the app makes it a link or a button. */
export function segmentClass(isChosen: boolean): string {
  const shape = 'inline-flex min-h-12 shrink-0 items-center gap-2 rounded-lg px-4 font-bold no-underline';
  return isChosen ? `${shape} bg-ink text-ground` : `${shape} bg-tile text-ink`;
}

/** Tabs that are pages: a row of links, which goes on in a second where it is too narrow: none is ever cut off. */
export function SegmentedTabs({ label, children }: { label: string; children: ReactNode }) {
  return (
    <nav aria-label={label} className="-mx-1 flex flex-wrap gap-2 px-1 py-1">
      {children}
    </nav>
  );
}

/** Choices within a page that show one part of it at a time. */
export function SegmentedChoice<Value extends string>({
  label,
  options,
  value,
  onChoose,
}: {
  label: string;
  options: readonly { value: Value; label: string }[];
  value: Value;
  onChoose: (value: Value) => void;
}) {
  return (
    // biome-ignore lint/a11y/useSemanticElements: a fieldset is for form answers; these buttons show and hide
    <div role="group" aria-label={label} className="-mx-1 flex flex-wrap gap-2 px-1 py-1">
      {options.map((option) => (
        <button
          key={option.value}
          type="button"
          aria-pressed={option.value === value}
          className={segmentClass(option.value === value)}
          onClick={() => onChoose(option.value)}
        >
          {option.label}
        </button>
      ))}
    </div>
  );
}
