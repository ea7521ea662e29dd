import { dayInWords } from '@/components/date-words'
import type { LabelSetting, SetName } from '@/lib/naming/label'
import type { NamingSettingsView } from '@/lib/names/present'

/** "58 mm of room, 15 pt, two lines". */
export const settingInWords = ({ width, size, lines }: LabelSetting): string =>
  `${width} mm of room, ${size} pt, ${lines === 1 ? 'one line' : 'up to two lines'}`

/** "Fits", "1.4 mm too wide", or which letters the font lacks. */
export function fitInWords({ fits, over, missing }: SetName): string {
  if (fits) return 'Fits'
  return [
    ...(over > 0 ? [`${over < 0.1 ? 'under 0.1' : over.toFixed(1)} mm too wide`] : []),
    ...(missing.length > 0 ? [`no letter for ${missing.join(' ')}`] : []),
  ].join(', ')
}

/** "1 name", "27 names". */
export const namesInWords = (count: number): string => (count === 1 ? '1 name' : `${count} names`)

/** Whether approved names are locked, since when or from when on. */
export function lockInWords(
  { frozen, printOn }: Pick<NamingSettingsView, 'frozen' | 'printOn'>,
  lockedSince: string | null,
): string {
  if (frozen) return lockedSince ? `Locked since ${dayInWords(lockedSince)}` : 'Locked'
  return printOn ? `Open until ${dayInWords(printOn)}` : 'Open, without a print date'
}

/** What stands wherever fibre and care are printed. */
export const FIBRE_CAUTION =
  'Fibre and care are set as the line gives them. What a label must say, and in which language, is for the rules of each country where the yarn is sold: check them before you print.'
