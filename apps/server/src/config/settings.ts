import { z } from 'zod';

const flag = z.enum(['0', '1'], { error: 'must be 0 or 1' }).transform((text) => text === '1');

const Settings = z.object({
  PORT: z.coerce
    .number({ error: 'must be a port number' })
    .int('must be a whole number')
    .min(0, 'must be 0 to 65535')
    .max(65535, 'must be 0 to 65535')
    .default(4310),
  WINDROW_HOST: z.string().min(1).default('127.0.0.1'),
  WINDROW_DATABASE: z.string().min(1, 'must be a file path').default('db/data/windrow.sqlite3'),
  WINDROW_DEMO: flag.default(false),
  /** The address that browsers use when TLS is ended in front; makes the cookie `__Host-` and Secure. */
  WINDROW_ORIGIN: z
    .url({ protocol: /^https?$/, error: 'must be an origin such as https://board.example.org' })
    .transform((url) => new URL(url).origin)
    .optional(),
  /** How many proxies in front to believe about a client's address. */
  WINDROW_PROXIES: z.coerce.number().int().min(0, 'must be 0 to 5').max(5, 'must be 0 to 5').default(0),
  WINDROW_LOG: z
    .enum(['silent', 'error', 'warn', 'info', 'debug'], {
      error: 'must be silent, error, warn, info or debug',
    })
    .default('info'),
});

export type Settings = {
  port: number;
  host: string;
  database: string;
  demo: boolean;
  origin: string | null;
  proxies: number;
  logLevel: z.infer<typeof Settings>['WINDROW_LOG'];
};

/**
 * Reads every setting once. Throws one error that names each fault, a misspelt WINDROW_ name among them:
 * a service that starts with a setting ignored would do so quietly for years.
 */
export function readSettings(environment: Record<string, string | undefined>): Settings {
  const known = Object.keys(Settings.shape);
  const unknown = Object.keys(environment).filter(
    (name) => name.startsWith('WINDROW_') && !known.includes(name),
  );
  const parsed = Settings.safeParse(environment);
  const faults = [
    ...(parsed.error?.issues.map(
      (issue) =>
        `${issue.path.join('.')}: ${issue.message}, not ${JSON.stringify(environment[String(issue.path[0])])}`,
    ) ?? []),
    ...unknown.map((name) => `${name}: no such setting; there are ${known.join(', ')}`),
  ];
  if (!parsed.success || faults.length > 0)
    throw new Error(`Settings are not accepted:\n${faults.map((fault) => `  ${fault}`).join('\n')}`);
  const { PORT, WINDROW_HOST, WINDROW_DATABASE, WINDROW_DEMO, WINDROW_ORIGIN, WINDROW_PROXIES, WINDROW_LOG } =
    parsed.data;
  return {
    port: PORT,
    host: WINDROW_HOST,
    database: WINDROW_DATABASE,
    demo: WINDROW_DEMO,
    origin: WINDROW_ORIGIN ?? null,
    proxies: WINDROW_PROXIES,
    logLevel: WINDROW_LOG,
  };
}
