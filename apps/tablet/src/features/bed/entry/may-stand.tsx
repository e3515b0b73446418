import { Notice } from '@windrow/ui/controls/notice';
import { useEffect, useRef } from 'react';

/**
 * After the sending of an unanswered entry was stopped, for as long as the form is not recorded. With the
 * focus it is in sight and heard first; without, it is told as news.
 */
export function MayStand({ takesFocus = false }: { takesFocus?: boolean }) {
  const box = useRef<HTMLDivElement>(null);
  useEffect(() => {
    if (takesFocus) box.current?.focus();
  }, [takesFocus]);
  return (
    <div ref={box} tabIndex={takesFocus ? -1 : undefined} className="scroll-mt-20 outline-none">
      <Notice tone="attention" isNews={!takesFocus} title="The first try may have been recorded">
        <p>Look in the record before you record again.</p>
      </Notice>
    </div>
  );
}
