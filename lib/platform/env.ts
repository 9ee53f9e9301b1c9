import { z } from 'zod';

const schema = z.object({
  RAGLAN_DATABASE_URL: z.string().min(1),
  /** Only the worker, the migrations and the demo loader have it; the web process runs without. */
  RAGLAN_OWNER_URL: z.string().optional(),
  RAGLAN_SECRET: z.string().min(16),
  RAGLAN_BASE_URL: z.url().default('http://localhost:3000'),
  RAGLAN_DEMO: z
    .enum(['0', '1'])
    .default('0')
    .transform((value) => value === '1'),
  /** A bundle and a reminder read on a second connection while they write on the first. */
  RAGLAN_DB_POOL: z.coerce.number().int().min(4).max(100).default(10),
  /** How many reverse proxies stand in front: that many entries of X-Forwarded-For are believed, from the right. */
  RAGLAN_TRUSTED_PROXIES: z.coerce.number().int().min(0).max(10).default(0),
  SMTP_URL: z.string().optional(),
  MAIL_FROM: z.string().default('Raglan <no-reply@raglan.example>'),
  MAIL_INBOX_URL: z.url().optional(),
  LOG_LEVEL: z.enum(['fatal', 'error', 'warn', 'info', 'debug', 'trace', 'silent']).default('info'),
  NODE_ENV: z.string().default('production'),
});
export type Environment = z.infer<typeof schema>;

let parsed: Environment | undefined;

/** The settings of this process, read and checked once; throws one sentence per wrong or missing setting. */
export function getEnv(): Environment {
  if (parsed) return parsed;
  const result = schema.safeParse(process.env);
  if (!result.success) {
    const lines = result.error.issues.map((issue) => `${issue.path.join('.')}: ${issue.message}`);
    throw new Error(`The settings are not complete. ${lines.join('; ')}. See "Configuration" in README.md.`);
  }
  parsed = result.data;
  return parsed;
}
