import { z } from 'zod'

const flag = z.enum(['true', 'false']).transform((value) => value === 'true')

const schema = z.object({
  NODE_ENV: z.enum(['development', 'production', 'test']).default('development'),
  APP_ORIGIN: z.url().default('http://localhost:3000'),
  NEXTAUTH_SECRET: z.string().min(32),
  DATABASE_URL: z.string().regex(/^postgres(ql)?:\/\//),
  DATABASE_POOL_MAX: z.coerce.number().int().min(1).max(100).default(10),
  S3_ENDPOINT: z.url(),
  S3_PUBLIC_ENDPOINT: z.url().optional(),
  S3_REGION: z.string().default('us-east-1'),
  S3_BUCKET: z.string().min(3).default('woadmap'),
  S3_ACCESS_KEY_ID: z.string().min(1),
  S3_SECRET_ACCESS_KEY: z.string().min(1),
  SMTP_URL: z.string().regex(/^smtps?:\/\//),
  MAIL_FROM: z.string().min(3).default('Woadmap <woadmap@localhost>'),
  TRUSTED_PROXIES: z.coerce.number().int().min(0).max(5).default(0),
  LOG_LEVEL: z.enum(['fatal', 'error', 'warn', 'info', 'debug', 'silent']).default('info'),
  SEED_DEMO: flag.default(true),
})

/** The settings of this process, as .env.example describes them. */
export type Env = z.infer<typeof schema>

/** True while `next build` evaluates our modules: no setting is there, and nothing may connect. */
export const building = process.env.NEXT_PHASE === 'phase-production-build'

/** True in a process that serves pages, where somebody waits for every answer. Set by Next.js. */
export const serving = process.env.NEXT_RUNTIME !== undefined

let parsed: Env | undefined

/**
 * The environment, parsed once and on first use: modules are also evaluated while the product is
 * being built, when no setting is there.
 * @throws Error naming every setting that is missing or malformed (names only, never values)
 */
export function env(): Env {
  if (parsed) return parsed
  // An empty line in .env means "not set".
  const given = Object.fromEntries(Object.entries(process.env).filter(([, value]) => value !== ''))
  const result = schema.safeParse(given)
  if (!result.success) {
    const names = [...new Set(result.error.issues.map((issue) => issue.path.join('.')))]
    throw new Error(`Settings missing or malformed: ${names.join(', ')}. See .env.example.`)
  }
  return (parsed = result.data)
}
