/** Where an exported calculation stands: `./oxygenation/pf-ratio.ts`, of the subject `oxygenation`. */
export type ExportedCalculation = { name: string; path: string; subject: string };

const EXPORT = /export \{([^}]*)\} from '(\.\/([\w-]+)\/[\w-]+\.ts)'/g;

/** The calculations that the package's barrel exports, in its order; types are none. */
export function exportedCalculations(barrel: string): ExportedCalculation[] {
  return [...barrel.matchAll(EXPORT)].flatMap(([, names = '', path = '', subject = '']) =>
    names
      .split(',')
      .map((name) => name.trim())
      .filter((name) => name !== '' && !name.startsWith('type '))
      .map((name) => ({ name, path, subject })),
  );
}
