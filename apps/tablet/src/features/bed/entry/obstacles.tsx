import { Notice } from '@windrow/ui/controls/notice';
import { useEffect, useRef } from 'react';
import type { Obstacle } from './judge-entry.ts';
import { focusRow } from './row-id.ts';

/** What stands in the way, all of it, each one press away from where it can be mended. */
export function Obstacles({
  obstacles,
  others,
  tries,
}: {
  obstacles: readonly Obstacle[];
  others: readonly string[];
  tries: number;
}) {
  const box = useRef<HTMLDivElement>(null);
  const many = obstacles.length + others.length;
  const hasAny = many > 0;
  useEffect(() => {
    // After each try, wherever the page was scrolled to; not while the person is mending.
    if (tries > 0) box.current?.scrollIntoView({ block: 'center' });
  }, [tries]);

  return (
    // Always there, so that it is heard; without a place of its own while it is empty.
    <div ref={box} role="alert" className={hasAny ? '' : 'absolute'}>
      {hasAny && (
        <Notice
          tone="attention"
          title={
            many === 1
              ? 'One thing before this can be recorded'
              : `${many} things before this can be recorded`
          }
        >
          <ul className="flex flex-col">
            {others.map((message) => (
              <li key={message}>{message}</li>
            ))}
            {obstacles.map(({ key, message }) => (
              <li key={key}>
                <button type="button" className="min-h-12 text-left underline" onClick={() => focusRow(key)}>
                  {message}
                </button>
              </li>
            ))}
          </ul>
        </Notice>
      )}
    </div>
  );
}
