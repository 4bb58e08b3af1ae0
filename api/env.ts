import * as z from 'zod';

const list = (text: string) =>
  text
    .split(',')
    .map((part) => part.trim())
    .filter((part) => part !== '');

const proxies = z.string().transform((text) => (/^\d+$/.test(text) ? Number(text) : list(text)));

const schema = z
  .object({
    /** The application role's address of the database. */
    DATABASE_URL: z.url({ protocol: /^postgres(ql)?$/ }),
    HOST: z.string().default('127.0.0.1'),
    PORT: z.coerce.number().int().min(0).max(65_535).default(3000),
    /** How people reach the server; https turns on secure cookies and HSTS. */
    PUBLIC_URL: z.url({ protocol: /^https?$/ }).optional(),
    /** One or several, newest first, divided by commas. */
    SESSION_SECRET: z
      .string()
      .transform(list)
      .pipe(z.array(z.string().min(32, 'Each secret needs 32 characters or more.')).min(1)),
    /** How many proxies stand in front, or their addresses divided by commas. */
    TRUST_PROXY: proxies.default(0),
    /** The exported web app; empty serves the API alone. */
    WEB_ROOT: z.string().default('dist'),
    LOG_LEVEL: z.enum(['fatal', 'error', 'warn', 'info', 'debug', 'silent']).default('info'),
    /** Puts the demo shop into the database, once. Its passwords are public. */
    SEED_DEMO: z.stringbool().default(false),
  })
  .refine((env) => !env.PUBLIC_URL?.startsWith('https:') || env.TRUST_PROXY !== 0, {
    path: ['TRUST_PROXY'],
    message: 'PUBLIC_URL is https, so a proxy ends TLS in front: say how many proxies there are.',
  });

export type Env = z.infer<typeof schema>;

/** Reads the settings, or throws an error that names each wrong one. */
export function readEnv(variables: NodeJS.ProcessEnv): Env {
  const result = schema.safeParse(variables);
  if (result.success) return result.data;
  const lines = result.error.issues.map((issue) => `  ${issue.path.join('.')}: ${issue.message}`);
  throw new Error(`The server's settings are wrong:\n${lines.join('\n')}`);
}
