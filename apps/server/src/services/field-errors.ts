import type { z } from 'zod';

/** The fields that a schema refused, by path, each with what is accepted. */
export function fieldErrors(error: z.ZodError, under = ''): { path: string; message: string }[] {
  return error.issues.flatMap((issue) => {
    const path = [under, ...issue.path.map(String)].filter(Boolean).join('.');
    if (issue.code === 'unrecognized_keys') {
      return issue.keys.map((key) => ({
        path: path ? `${path}.${key}` : key,
        message: 'is not a field here',
      }));
    }
    return [{ path, message: issue.message }];
  });
}
