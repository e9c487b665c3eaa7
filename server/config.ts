import { z } from 'zod';

const port = z.coerce.number().int().min(0).max(65535);
const flag = z.enum(['yes', 'no']).transform((value) => value === 'yes');

/** Everything that can be set from outside, with what it is when unset. `.env.example` says the same in words. */
const settings = z.object({
  PORT: port.default(4100),
  HOST: z.string().min(1).default('127.0.0.1'),
  DATABASE_URL: z.url({ protocol: /^mysql$/ }),
  DATABASE_CONNECTIONS: z.coerce.number().int().min(2).max(200).default(16),
  /** Where people reach the product; links in mail start with it. https turns on the Secure cookie and HSTS. */
  PUBLIC_URL: z.url({ protocol: /^https?$/ }).optional(),
  SESSION_SECRET: z.string().min(32),
  SMTP_URL: z.url({ protocol: /^smtps?$/ }).optional(),
  MAIL_FROM: z.email().default('book@tarekeep.example'),
  /** Seconds after which a request that still waits is answered 503. */
  REQUEST_SECONDS: z.coerce.number().positive().max(120).default(20),
  FILES_DIR: z.string().min(1).default('.local/files'),
  CLIENT_DIR: z.string().min(1).default('dist'),
  TRUST_PROXY: flag.default(false),
  LOG_LEVEL: z.enum(['silent', 'error', 'warn', 'info', 'debug']).default('info'),
  /** Hours without a request after which a session ends, and hours after which it ends in any case. */
  SESSION_IDLE_HOURS: z.coerce.number().positive().max(168).default(12),
  SESSION_MAX_HOURS: z.coerce.number().positive().max(720).default(72),
  /** "no" leaves scheduled work and mail to other servers. */
  RUN_JOBS: flag.default(true),
});

export type Config = Omit<z.output<typeof settings>, 'PUBLIC_URL'> & { PUBLIC_URL: string };

/** Parses the environment; every bad variable is named at once. */
export function readConfig(environment: Record<string, string | undefined>): Config {
  const given = Object.fromEntries(
    Object.entries(environment).filter(([, value]) => value !== undefined && value !== ''),
  );
  const parsed = settings.safeParse(given);
  if (!parsed.success) {
    const named = parsed.error.issues.map((issue) => `  ${issue.path.join('.')}: ${issue.message}`);
    throw new Error(`The configuration cannot be used:\n${named.join('\n')}`);
  }
  const { PUBLIC_URL, ...rest } = parsed.data;
  return { ...rest, PUBLIC_URL: (PUBLIC_URL ?? `http://localhost:${rest.PORT}`).replace(/\/$/, '') };
}
