import { Op } from 'sequelize'

import { lineObject } from '@/lib/activity/objects'
import { recordActivity } from '@/lib/activity/record'
import { inTransaction, Line, NamingSettings } from '@/models'

import { findSettings } from './change-names'
import { dayOf } from './freeze'

/**
 * The work of the job `freeze-names`: notes of every line whose label printer's day has come that
 * its names are locked. They are locked from that day on in any case.
 * @param now for tests
 */
export async function freezeDueNames(now = new Date()): Promise<{ frozen: number }> {
  const isDue = { frozenAt: null, printOn: { [Op.lte]: dayOf(now) } }
  const due = await NamingSettings.findAll({
    attributes: ['brandId', 'lineId'],
    where: isDue,
    raw: true,
  })
  let frozen = 0
  for (const { brandId, lineId } of due) {
    frozen += await inTransaction(async (transaction) => {
      // As every change of names does, so that an owner who moves the day is before or after.
      const line = await Line.findOne({
        where: { brandId, id: lineId },
        lock: transaction.LOCK.NO_KEY_UPDATE,
        transaction,
      })
      const settings = line && (await findSettings(line, transaction))
      if (!settings || settings.frozenAt || !settings.printOn || settings.printOn > dayOf(now))
        return 0
      await settings.update({ frozenAt: now, version: settings.version + 1 }, { transaction })
      await recordActivity(
        { brandId, personId: null },
        { action: 'name.frozen', object: lineObject(line) },
        transaction,
      )
      return 1
    })
  }
  return { frozen }
}
