import { DropdownMenu } from 'radix-ui';
import type { ReactNode } from 'react';

const ITEM =
  'flex min-h-12 cursor-pointer items-center gap-3 rounded-md px-3 font-bold text-ink no-underline outline-none data-highlighted:bg-ink data-highlighted:text-ground';

/** A menu that opens from a button; arrows, first letters and Escape work in it. */
export function Menu({
  trigger,
  label,
  children,
}: {
  trigger: ReactNode;
  label: string;
  children: ReactNode;
}) {
  return (
    // A modal menu would lock the page by a style element, which our policy forbids.
    <DropdownMenu.Root modal={false}>
      <DropdownMenu.Trigger asChild>{trigger}</DropdownMenu.Trigger>
      <DropdownMenu.Portal>
        <DropdownMenu.Content
          aria-label={label}
          align="end"
          sideOffset={6}
          collisionPadding={8}
          className="z-50 flex max-h-(--radix-dropdown-menu-content-available-height) min-w-56 flex-col overflow-y-auto rounded-xl border-2 border-ink bg-tile p-2"
        >
          {children}
        </DropdownMenu.Content>
      </DropdownMenu.Portal>
    </DropdownMenu.Root>
  );
}

export function MenuItem({ onSelect, children }: { onSelect: () => void; children: ReactNode }) {
  return (
    <DropdownMenu.Item className={ITEM} onSelect={onSelect}>
      {children}
    </DropdownMenu.Item>
  );
}

/** An item that is a link, given as its one child. */
export function MenuLink({ children }: { children: ReactNode }) {
  return (
    <DropdownMenu.Item asChild className={ITEM}>
      {children}
    </DropdownMenu.Item>
  );
}

/** Words in a menu that are no item. */
export function MenuLabel({ children }: { children: ReactNode }) {
  return <DropdownMenu.Label className="px-3 py-2 text-ink-muted text-sm">{children}</DropdownMenu.Label>;
}

export function MenuLine() {
  return <DropdownMenu.Separator className="my-2 h-px bg-line" />;
}
