/**
 * `npm run match -- --line shades.csv photo…`: matches photographs to a line without database or
 * web, one line of JSON a photograph. `--lock` and `--exclude` take shade numbers, `--apart` a ΔE00.
 * Exits 1 when a photograph could not be read, 2 when what was asked makes no sense.
 */
import { readFileSync } from 'node:fs'
import { parseArgs } from 'node:util'

import {
  isMatch,
  matchPhotograph,
  READING_KINDS,
  type Match,
  type MatchShade,
  type MatchWishes,
  type NoMatch,
} from '@/lib/color/match'
import { readPhotographColors } from '@/lib/color/photograph-colors'
import { decodePhotograph } from '@/lib/photographs/decode'
import { warmUpReading } from '@/lib/photographs/warm-up'
import { guessMapping, mappingProblems, readRows } from '@/lib/shades/csv'
import { describeError, parseSheet } from '@/lib/shades/csv-text'

const USAGE =
  'npm run match -- --line shades.csv [--lock 14]… [--exclude 22]… [--apart 10] photo.jpg…'

/** The shades of a line as its CSV says, without the retired; the number serves as the id. */
export function readLine(path: string): MatchShade[] {
  const sheet = parseSheet(readFileSync(path, 'utf8'))
  const mapping = guessMapping(sheet.header)
  const rows = readRows(sheet, mapping, null)
  const problems = mappingProblems(mapping, null)
  for (const { row, errors } of problems.length ? [] : rows)
    problems.push(...errors.map((error) => describeError(row, error)))
  if (problems.length > 0) throw new RangeError(`${path}: ${problems.join('\n')}`)
  return rows.flatMap(({ shade }) =>
    shade?.color && shade.status !== 'retired'
      ? [{ id: shade.number, lab: [shade.color.labL, shade.color.labA, shade.color.labB] as const }]
      : [],
  )
}

/** A reading as it is printed: shade numbers instead of ids, and no map of the cells. */
function present(reading: Match | NoMatch) {
  if (!isMatch(reading)) return reading
  return {
    ...reading,
    assignment: undefined,
    places: reading.places.map(({ shadeId, ...place }) => ({ shade: shadeId, ...place })),
  }
}

async function matchFile(path: string, line: MatchShade[], wishes: MatchWishes) {
  const { image, width, height, format, decodeMs } = await decodePhotograph(path)
  const started = performance.now()
  const colors = readPhotographColors(image)
  const readings = READING_KINDS.map((kind) => matchPhotograph(colors, line, kind, wishes))
  const restMs = performance.now() - started
  return {
    photograph: path,
    format,
    width,
    height,
    ms: { decode: decodeMs, rest: restMs },
    readings: readings.map(present),
  }
}

async function main(): Promise<number> {
  const { values, positionals } = parseArgs({
    allowPositionals: true,
    options: {
      line: { type: 'string' },
      lock: { type: 'string', multiple: true },
      exclude: { type: 'string', multiple: true },
      apart: { type: 'string' },
    },
  })
  if (!values.line || positionals.length === 0) throw new RangeError(USAGE)
  const line = readLine(values.line)
  const wishes: MatchWishes = {
    locked: values.lock,
    excluded: values.exclude,
    ...(values.apart !== undefined && { apart: Number(values.apart) }),
  }
  await warmUpReading()
  let failed = 0
  for (const photograph of positionals) {
    try {
      console.log(JSON.stringify(await matchFile(photograph, line, wishes)))
    } catch (error) {
      failed++
      const { code, message } = error as NodeJS.ErrnoException
      const words = code === 'ENOENT' ? 'There is no such file.' : message
      console.log(JSON.stringify({ photograph, error: words }))
    }
  }
  return failed ? 1 : 0
}

process.exitCode = await main().catch((error: Error) => {
  console.error(error.message)
  return 2
})
