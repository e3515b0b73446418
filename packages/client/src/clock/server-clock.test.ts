import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';

const SERVER_MS = Date.parse('2026-03-05T10:00:00.000Z');
const at = (ms: number) => new Date(SERVER_MS + ms).toISOString();

describe('the server clock', () => {
  let clock: typeof import('./server-clock.ts');
  beforeEach(async () => {
    vi.useFakeTimers({ now: Date.parse('2031-01-01T00:00:00Z') });
    vi.resetModules();
    clock = await import('./server-clock.ts');
    clock.noteServerTime(at(0));
  });
  afterEach(() => {
    vi.useRealTimers();
  });

  it('follows the server, whatever this device believes', () => {
    vi.advanceTimersByTime(90_000);
    expect(clock.serverNow()).toBe(SERVER_MS + 90_000);
  });

  it('does not run back when somebody sets the clock of the device back', () => {
    vi.setSystemTime(Date.now() - 7_200_000);
    vi.advanceTimersByTime(5_000);
    expect(clock.serverNow()).toBe(SERVER_MS + 5_000);
  });

  it('counts the hours that the device slept', () => {
    vi.setSystemTime(Date.now() + 3_600_000);
    expect(clock.serverNow()).toBe(SERVER_MS + 3_600_000);
  });

  it('takes a later time at once, and lets a slow message pull it back only a little', () => {
    vi.advanceTimersByTime(5_000);
    clock.noteServerTime(at(5_400));
    expect(clock.serverNow()).toBe(SERVER_MS + 5_400);
    vi.advanceTimersByTime(5_000);
    clock.noteServerTime(at(10_000));
    expect(clock.serverNow()).toBe(SERVER_MS + 10_350);
  });

  it('follows a server whose own clock was set back, and says that it jumped', () => {
    const jumped = vi.fn();
    clock.onClockJump(jumped);
    clock.noteServerTime(at(-60_000));
    expect(clock.serverNow()).toBe(SERVER_MS - 60_000);
    expect(jumped).toHaveBeenCalledOnce();
  });

  it('ignores what is not a time', () => {
    clock.noteServerTime('soon');
    expect(clock.serverNow()).toBe(SERVER_MS);
  });
});
