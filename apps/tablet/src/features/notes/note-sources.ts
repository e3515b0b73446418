import { queryOptions } from '@tanstack/react-query';
import { exportedCalculations } from '@windrow/ventilation/notes/exported-calculations';
import { type MethodNote, parseDocblock } from '@windrow/ventilation/notes/parse-docblock';
import barrel from '../../../../../packages/ventilation/src/index.ts?raw';

/** The text of each file of a subject, fetched when it is wanted: the notes are read from the code as it was built. */
const SOURCES = import.meta.glob<string>(
  [
    '../../../../../packages/ventilation/src/{acid-base,aids,airway,freshness,mechanics,oxygenation,physiology,queueing,readiness,scores,supply,surveillance,units}/*.ts',
    '!**/*.test.ts',
  ],
  { query: '?raw', import: 'default' },
);

/** Every calculation that has a note, in the order of the barrel. */
export const CALCULATIONS = exportedCalculations(barrel);

export type Listed = { subject: string; note: MethodNote };

export type Runnable = {
  note: MethodNote;
  /** The file that the note was read from. */
  code: string;
  calculation: (input: unknown) => unknown;
};

export function sourceOf(path: string): Promise<string> {
  const source = SOURCES[path.replace('./', '../../../../../packages/ventilation/src/')];
  return source ? source() : Promise.reject(new Error(`${path} is in no folder that has notes`));
}

/** All notes, for the list and its search. They are part of the app, so they never grow old. */
export function allNotesQuery() {
  return queryOptions({
    queryKey: ['method-notes'],
    queryFn: async (): Promise<Listed[]> =>
      Promise.all(
        CALCULATIONS.map(async ({ path, subject }) => ({
          subject,
          note: parseDocblock(await sourceOf(path)),
        })),
      ),
    staleTime: Number.POSITIVE_INFINITY,
  });
}

/** One note with the calculation itself; null where there is none of this name. */
export function noteQuery(name: string) {
  return queryOptions({
    queryKey: ['method-notes', name],
    queryFn: async (): Promise<Runnable | null> => {
      const found = CALCULATIONS.find((calculation) => calculation.name === name);
      if (!found) return null;
      const [code, calculation] = await Promise.all([sourceOf(found.path), calculationOf(name)]);
      return { note: parseDocblock(code), code, calculation };
    },
    staleTime: Number.POSITIVE_INFINITY,
  });
}

/** The very functions that the board is made with, fetched with the first note. */
async function calculationOf(name: string): Promise<Runnable['calculation']> {
  const all: Readonly<Record<string, unknown>> = { ...(await import('@windrow/ventilation')) };
  const calculation = all[name];
  if (typeof calculation !== 'function') throw new Error(`${name} is not exported`);
  return (input) => calculation(input);
}
