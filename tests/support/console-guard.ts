import { afterEach, beforeEach, vi } from 'vitest';

/** What a test prints as an error or a warning fails it: a fault that only the log shows is still a fault. */
const LEVELS = ['error', 'warn'] as const;

beforeEach(() => {
  for (const level of LEVELS) {
    vi.spyOn(console, level).mockImplementation((...words: unknown[]) => {
      throw new Error(`console.${level} in a test: ${words.map(String).join(' ')}`);
    });
  }
});

afterEach(() => {
  for (const level of LEVELS) vi.mocked(console[level]).mockRestore?.();
});
