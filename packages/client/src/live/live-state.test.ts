import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import {
  beginListening,
  isUpgraded,
  lastHeardAt,
  liveState,
  noteHeard,
  noteVersion,
  stateAfter,
} from './live-state.ts';

describe('stateAfter', () => {
  it.each([
    [0, 'live'],
    [14_999, 'live'],
    [15_000, 'not-live'],
    [299_999, 'not-live'],
    [300_000, 'withdrawn'],
  ])('after %i ms of silence a link that was heard is %s', (silentMs, state) => {
    expect(stateAfter({ silentMs, everHeard: true })).toBe(state);
  });

  it('is connecting until first heard, but not for ever', () => {
    expect(stateAfter({ silentMs: 3_000, everHeard: false })).toBe('connecting');
    expect(stateAfter({ silentMs: 15_000, everHeard: false })).toBe('not-live');
  });
});

describe('liveState', () => {
  beforeEach(() => {
    vi.useFakeTimers();
    beginListening();
  });
  afterEach(() => {
    vi.useRealTimers();
  });

  it('heals when the server is heard again', () => {
    noteHeard('u1');
    vi.advanceTimersByTime(20_000);
    expect(liveState('u1')).toBe('not-live');
    noteHeard('u1');
    expect(liveState('u1')).toBe('live');
  });

  it('tells a unit that does not keep up from a server that is heard', () => {
    noteHeard('u1');
    vi.advanceTimersByTime(16_000);
    noteHeard('u2');
    expect(liveState()).toBe('live');
    expect(liveState('u1')).toBe('not-live');
    expect(lastHeardAt('u1')).toBe(Date.now() - 16_000);
  });

  it('counts the time that the device slept, in which only the wall clock ran', () => {
    noteHeard('u1');
    vi.setSystemTime(Date.now() + 3_600_000);
    expect(liveState('u1')).toBe('withdrawn');
  });

  it('knows when the server runs another version than at first', () => {
    noteVersion('1.0.0');
    noteVersion('1.0.0');
    expect(isUpgraded()).toBe(false);
    noteVersion('1.0.1');
    expect(isUpgraded()).toBe(true);
  });
});
