import type { VentilatorState } from '@windrow/ventilation/contract/fleet';
import type { ReactNode } from 'react';

/** One machine as a mark. Each state has its own shape; tone only helps, and words always stand beside. */
const SHAPES: Record<VentilatorState, ReactNode> = {
  'in-use': <circle cx="10" cy="10" r="8" className="fill-ink" />,
  ready: <circle cx="10" cy="10" r="6.5" className="fill-none stroke-ink" strokeWidth="3" />,
  cleaning: <rect x="3" y="3" width="14" height="14" rx="4" className="fill-block" />,
  held: (
    <circle
      cx="10"
      cy="10"
      r="6.5"
      className="fill-none stroke-ink-muted"
      strokeWidth="3"
      strokeDasharray="3.4 3.4"
    />
  ),
  'on-loan': <path d="M10 2 18 10 10 18 2 10Z" className="fill-none stroke-ink" strokeWidth="2.5" />,
  retired: <path d="M4 4 16 16M16 4 4 16" className="fill-none stroke-ink-muted" strokeWidth="2.5" />,
};

export function MachineMark({ state }: { state: VentilatorState }) {
  return (
    <svg viewBox="0 0 20 20" className="size-5 shrink-0" aria-hidden="true">
      {SHAPES[state]}
    </svg>
  );
}
