/** The little that a tablet may remember: nothing about people, and all of it can be lost. */
export function recall(key: string): string | null {
  try {
    return localStorage.getItem(`windrow.${key}`);
  } catch {
    return null;
  }
}

export function remember(key: string, value: string): void {
  try {
    localStorage.setItem(`windrow.${key}`, value);
  } catch {
    // A browser that keeps nothing is no reason to stop.
  }
}
