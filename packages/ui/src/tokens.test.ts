import { readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';

const css = readFileSync(new URL('./tokens.css', import.meta.url), 'utf8');

type Theme = Record<string, string>;
const theme = (name: string): Theme => {
  const block = css.split(`[data-theme="${name}"]`)[1]?.split('}')[0] ?? '';
  return Object.fromEntries(
    [...block.matchAll(/--([a-z-]+): (#[0-9a-f]{6});/g)].map(([, role, hex]) => [role, hex]),
  );
};

const channels = (hex: string) =>
  [1, 3, 5].map((from) => Number.parseInt(hex.slice(from, from + 2), 16) / 255);

/** @source WCAG 2.2, relative luminance and contrast ratio. */
function luminance(hex: string): number {
  const [r = 0, g = 0, b = 0] = channels(hex).map((c) =>
    c <= 0.04045 ? c / 12.92 : ((c + 0.055) / 1.055) ** 2.4,
  );
  return 0.2126 * r + 0.7152 * g + 0.0722 * b;
}

function contrast(a: string, b: string): number {
  const [high = 0, low = 0] = [luminance(a), luminance(b)].sort((x, y) => y - x);
  return (high + 0.05) / (low + 0.05);
}

function hueAndSaturation(hex: string): { hue: number; saturation: number } {
  const [r = 0, g = 0, b = 0] = channels(hex);
  const max = Math.max(r, g, b);
  const span = max - Math.min(r, g, b);
  if (span === 0) return { hue: 0, saturation: 0 };
  const sixth = max === r ? (g - b) / span : max === g ? 2 + (b - r) / span : 4 + (r - g) / span;
  return { hue: (sixth * 60 + 360) % 360, saturation: span / max };
}

const VALUES: [ink: string, ground: string][] = [
  ['ink', 'tile'],
  ['ink', 'ground'],
  ['ink', 'block-soft'],
  ['tile', 'ink'],
  ['ground', 'ink'],
  ['flag-ink', 'flag'],
  ['flag-text', 'tile'],
  ['flag-text', 'ground'],
  ['note', 'tile'],
  ['note', 'ground'],
];
const LABELS: [ink: string, ground: string][] = [
  ['ink-muted', 'tile'],
  ['ink-muted', 'ground'],
];
const SHAPES: [shape: string, ground: string][] = [
  ['line-strong', 'tile'],
  ['line-strong', 'ground'],
  ['focus', 'tile'],
  ['focus', 'ground'],
];

describe.each(['night', 'day'])('the %s theme', (name) => {
  const roles = theme(name);
  const ratio = ([a, b]: [string, string]) => contrast(roles[a] ?? '#000000', roles[b] ?? '#000000');

  it.each(VALUES)('shows values, %s on %s, at 7:1 or better', (...pair) => {
    expect(ratio(pair)).toBeGreaterThanOrEqual(7);
  });
  it.each(LABELS)('shows labels, %s on %s, at 4.5:1 or better', (...pair) => {
    expect(ratio(pair)).toBeGreaterThanOrEqual(4.5);
  });
  it.each(SHAPES)('draws shapes that mean something, %s on %s, at 3:1 or better', (...pair) => {
    expect(ratio(pair)).toBeGreaterThanOrEqual(3);
  });

  it.each(Object.entries(theme(name)))('keeps %s away from the colours of alarms', (_role, hex) => {
    const { hue, saturation } = hueAndSaturation(hex);
    const isAlarm = hue >= 345 || hue <= 15 || (hue >= 40 && hue <= 65) || (hue >= 175 && hue <= 195);
    expect(isAlarm && saturation > 0.5).toBe(false);
  });
});
