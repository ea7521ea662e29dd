import { readFileSync } from 'node:fs'
import { parseEnv } from 'node:util'

/**
 * The environment with what `.env` adds to it. What is already set wins; an empty value, in either
 * place, means "not set".
 * @param {string} path the .env file; need not exist
 * @param {Record<string, string | undefined>} given the environment we were started with
 */
export function readEnvironment(path, given = process.env) {
  return { ...withoutEmpty(parseFile(path)), ...withoutEmpty(given) }
}

function parseFile(path) {
  try {
    return parseEnv(readFileSync(path, 'utf8'))
  } catch (error) {
    if (error.code === 'ENOENT') return {}
    throw error
  }
}

function withoutEmpty(values) {
  return Object.fromEntries(Object.entries(values).filter(([, value]) => value !== ''))
}
