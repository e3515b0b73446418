import { ProblemError } from '@windrow/client/http';

/** The parts of an issue that can be put in plain words. */
type Issue = { code?: string; minimum?: unknown; maximum?: unknown; multipleOf?: unknown; format?: unknown };

/** What is wrong with a number whose schema has no words of its own. */
export function numberWords(issue: Issue): string {
  if (issue.code === 'too_small') return `not below ${String(issue.minimum)}`;
  if (issue.code === 'too_big') return `not above ${String(issue.maximum)}`;
  if (issue.code === 'invalid_format') return 'enter a time such as 07:00';
  // A number that should be whole is refused as being of the wrong type.
  return issue.format === 'safeint' || issue.format === 'int' ? 'enter a whole number' : 'enter a number';
}

/** Whether somebody else changed it first. */
export function isStale(error: unknown): boolean {
  return error instanceof ProblemError && error.problem.type.endsWith(':stale-version');
}
