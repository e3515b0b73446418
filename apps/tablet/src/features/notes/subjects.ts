import type { Listed } from './note-sources.ts';

/** The folders of the calculations as a reader knows them, in the order of the page. */
const SUBJECTS: Readonly<Record<string, string>> = {
  physiology: 'Volumes and ventilation',
  mechanics: 'Mechanics',
  oxygenation: 'Oxygenation',
  'acid-base': 'Acid and base',
  airway: 'Airway',
  aids: 'Aids to setting',
  readiness: 'Readiness',
  scores: 'Scores',
  surveillance: 'Surveillance',
  supply: 'Gas supply',
  queueing: 'Capacity',
  freshness: 'Age of facts',
  units: 'Units',
};

/** A folder without a name here is told by its own; nothing is left out. */
export function subjectTitle(subject: string): string {
  return SUBJECTS[subject] ?? `${subject.slice(0, 1).toUpperCase()}${subject.slice(1).replaceAll('-', ' ')}`;
}

export type Subject = { title: string; notes: readonly Listed['note'][] };

/** Notes that hold every word of a search, by subject; subjects without any are not there. */
export function subjectsOf({ listed, search }: { listed: readonly Listed[]; search: string }): Subject[] {
  const words = search.toLowerCase().split(/\s+/).filter(Boolean);
  const found = listed.filter(({ subject, note }) => {
    const text = [
      note.title,
      note.name,
      subjectTitle(subject),
      note.meaning,
      note.formula,
      note.validity,
      ...note.arguments.map(({ label }) => label),
      ...note.sources,
    ]
      .join(' ')
      .toLowerCase();
    return words.every((word) => text.includes(word));
  });
  const folders = new Set([...Object.keys(SUBJECTS), ...found.map(({ subject }) => subject)]);
  return [...folders].flatMap((folder) => {
    const notes = found.filter(({ subject }) => subject === folder).map(({ note }) => note);
    return notes.length > 0 ? [{ title: subjectTitle(folder), notes }] : [];
  });
}
