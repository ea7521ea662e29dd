import { ConflictError } from '@/lib/errors'
import { DEFAULT_LABEL } from '@/lib/naming/label'
import { NamingSettings, updateVersioned } from '@/models'

import type { NamesAtWork } from './change-names'

/** Settings as a command writes them; what it leaves out stays, or is as it is without settings. */
type Values = Partial<
  Pick<
    NamingSettings,
    'labelWidth' | 'labelSize' | 'labelLines' | 'care' | 'themes' | 'printOn' | 'frozenAt'
  >
>

/** Goes on if the settings are as they were seen. @throws ConflictError */
export function requireSeen({ settings }: Pick<NamesAtWork, 'settings'>, version: number): void {
  if ((settings?.version ?? 0) === version) return
  throw new ConflictError(
    'Somebody else changed the settings of names first. Nothing was saved, and what you typed is still here: look at theirs, then do it again.',
  )
}

/**
 * Writes settings of a line whose row is held, and makes them where there are none yet.
 * @throws ConflictError when they are not of this version any more
 */
export async function writeSettings(
  { line, settings, transaction }: NamesAtWork,
  values: Values,
): Promise<NamingSettings> {
  const { id: lineId, brandId } = line
  if (!settings) {
    const { width, size, lines } = DEFAULT_LABEL
    const defaults = { labelWidth: width, labelSize: size, labelLines: lines }
    return NamingSettings.create({ ...defaults, ...values, brandId, lineId }, { transaction })
  }
  await updateVersioned(NamingSettings, settings.get(), values, transaction)
  return settings.reload({ transaction })
}
