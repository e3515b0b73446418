import { Mark } from '@windrow/ui/mark';
import type { ReactNode } from 'react';
import { ShellFooter } from './shell-footer.tsx';
import { useTheme } from './theme.ts';

/** Around what is shown while nobody is signed in. */
export function OutsideFrame({
  isDemonstration,
  children,
}: {
  isDemonstration: boolean;
  children: ReactNode;
}) {
  useTheme(null);
  return (
    <div className="flex min-h-dvh flex-col bg-ground text-ink">
      <main className="mx-auto flex w-full max-w-xl grow flex-col justify-center gap-6 p-5">
        <p className="flex items-center gap-3 font-bold text-2xl">
          <Mark />
          Windrow
        </p>
        {children}
      </main>
      <ShellFooter isDemonstration={isDemonstration} />
    </div>
  );
}
