import { z } from 'zod'

const flag = z.enum(['true', 'false']).transform((word) => word === 'true')
const port = z.coerce.number().int().min(0).max(65_535)

const environmentShape = z.object({
  NODE_ENV: z.enum(['production', 'development', 'test']).default('production'),
  DATABASE_URL: z.url({ protocol: /^postgres(ql)?$/ }),
  DATABASE_POOL: z.coerce.number().int().min(2).max(100).default(10),
  HOST: z.string().default('127.0.0.1'),
  PORT: port.default(4180),
  PUBLIC_URL: z.url({ protocol: /^https?$/ }),
  METRICS_PORT: port.optional(),
  TRUST_PROXY: z.coerce.number().int().min(0).max(10).default(0),
  FOLDGAUGE_SECRET: z.string().min(32),
  PAGE_FOLDER: z.string().optional(),
  SMTP_URL: z.url({ protocol: /^smtps?$/ }),
  MAIL_FROM: z.string().default('Foldgauge <foldgauge@localhost>'),
  S3_ENDPOINT: z.url().optional(),
  S3_REGION: z.string().default('us-east-1'),
  S3_BUCKET: z.string().default('foldgauge'),
  S3_ACCESS_KEY: z.string().optional(),
  S3_SECRET_KEY: z.string().optional(),
  LOG_LEVEL: z.enum(['debug', 'info', 'warn', 'error', 'silent']).default('info'),
  REQUESTS_PER_MINUTE: z.coerce.number().int().min(1).default(1_200),
  SIGN_INS_PER_QUARTER_HOUR: z.coerce.number().int().min(1).default(10),
  /** Memory of one password hash in KiB; small only in tests. */
  PASSWORD_MEMORY: z.coerce.number().int().min(64).default(19_456),
  /** Webhooks to private addresses are for development only. */
  ALLOW_PRIVATE_WEBHOOKS: flag.default(false),
  /** Every answer is held against its contract: tests and development. */
  CHECK_ANSWERS: flag.default(false),
})

export type Config = Readonly<z.output<typeof environmentShape>>

/** What is wrong with the environment, every variable at once. */
export class ConfigError extends Error {}

/** Reads the environment. @throws ConfigError that names each variable and its need */
export function readConfig(environment: Readonly<Record<string, string | undefined>>): Config {
  const read = environmentShape.safeParse(environment)
  if (read.success) return read.data
  const lines = read.error.issues.map((issue) => {
    const name = issue.path.join('.')
    return environment[name] === undefined ? `${name} is not set` : `${name}: ${issue.message}`
  })
  throw new ConfigError(`The server cannot start with this environment:\n  ${lines.join('\n  ')}`)
}
