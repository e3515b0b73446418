import { useSyncExternalStore } from 'react';

/** The screen that the sizes are drawn for; wall.css makes 1rem of it the same share of any other. */
const DRAWN = { width: 1920, height: 1080 };

export type Viewport = { width: number; height: number; scale: number };

/** The window in points of a 1920 x 1080 screen, and how large such a point is here. */
export function useViewport(): Viewport {
  const width = useSyncExternalStore(subscribe, () => window.innerWidth);
  const height = useSyncExternalStore(subscribe, () => window.innerHeight);
  const scale = Math.min(width / DRAWN.width, height / DRAWN.height) || 1;
  return { width: width / scale, height: height / scale, scale };
}

function subscribe(reader: () => void): () => void {
  window.addEventListener('resize', reader);
  return () => window.removeEventListener('resize', reader);
}
