import { dirname, join, resolve } from 'node:path'
import { fileURLToPath } from 'node:url'

/** The top of the repository. */
export const ROOT = resolve(dirname(fileURLToPath(import.meta.url)), '../..')

/** The command line of Next.js, run by node itself so that signals reach it. */
export const NEXT = join(ROOT, 'node_modules/next/dist/bin/next')
