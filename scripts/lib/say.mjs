/**
 * A problem that the person at the terminal can solve; shown as its sentence, without a stack.
 */
export class Refusal extends Error {
  /** @param {string} sentence what happened and what to do */
  constructor(sentence) {
    super(sentence)
    this.name = 'Refusal'
  }
}

/** Prints one line of progress. */
export function say(line) {
  process.stdout.write(`• ${line}\n`)
}

/** Prints an error as a person should see it: a Refusal's sentence, or the stack of a real bug. */
export function sayError(error) {
  const text = error instanceof Refusal ? error.message : (error?.stack ?? String(error))
  process.stderr.write(`\n✗ ${text}\n`)
}

/** Lines up rows of cells under a header row, two spaces apart. */
export function table(rows) {
  const widths = rows[0].map((_, column) => Math.max(...rows.map((row) => row[column].length)))
  return rows
    .map((row) => row.map((cell, column) => cell.padEnd(widths[column])).join('  '))
    .map((line) => `  ${line.trimEnd()}`)
    .join('\n')
}
