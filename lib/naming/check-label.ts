import type { Finding } from './finding'
import { setOnLabel, type FontMetrics, type LabelSetting } from './label'

/** Whether a name fits its ball band and the font has all its letters. */
export function checkLabel(name: string, font: FontMetrics, setting: LabelSetting): Finding[] {
  const { over, missing } = setOnLabel(name, font, setting)
  const findings: Finding[] = []
  const find = (what: string, why: string) =>
    findings.push({ check: 'label', grade: 'warning', what, why, sure: 'certain' })
  if (over > 0)
    find(
      `It is ${over.toFixed(1)} mm too long for the ball band.`,
      `Set in ${setting.size} pt on ${setting.lines === 1 ? 'one line' : 'two lines'} of ${setting.width} mm, and never hyphenated.`,
    )
  if (missing.length > 0)
    find(
      `The label’s font has no ${missing.map((letter) => `“${letter}”`).join(', ')}.`,
      'It would print as an empty box.',
    )
  return findings
}
