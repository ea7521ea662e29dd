/**
 * One measured figure beside what it has to reach.
 * @typedef {{what: string, value: string, bar: string, met: boolean | 'out of reach'}} Figure `met`
 *   is 'out of reach' when nothing could reach the bar, which the figure proves
 */

/**
 * Prints each figure beside its bar.
 * @param {Figure[]} figures
 * @returns {number} the exit code: 0 when every figure meets its bar, else 1
 */
export function printFigures(figures) {
  const width = (key) => Math.max(...figures.map((figure) => figure[key].length))
  for (const { what, value, bar, met } of figures) {
    const verdict = met === true ? 'met' : met || 'MISSED'
    process.stdout.write(
      `${verdict.padEnd(12)}  ${what.padEnd(width('what'))}  ${value.padEnd(width('value'))}  bar: ${bar}\n`,
    )
  }
  const missed = figures.filter(({ met }) => !met).length
  process.stdout.write(missed === 0 ? 'Every figure meets its bar.\n' : `${missed} missed.\n`)
  return missed === 0 ? 0 : 1
}
