import PgBoss from 'pg-boss'

import { env } from '@/lib/env'

import { QUEUES } from './queue'

/** A pg-boss of our settings, not yet started. @param supervise looks after dead jobs and schedules */
export function createBoss({ supervise }: { supervise: boolean }): PgBoss {
  return new PgBoss({
    connectionString: env().DATABASE_URL,
    application_name: 'woadmap jobs',
    max: 4,
    supervise,
    schedule: supervise,
    // How soon a killed worker's job is noticed, on top of its own expiry.
    maintenanceIntervalSeconds: 15,
    archiveCompletedAfterSeconds: 3600,
    deleteAfterDays: 7,
  })
}

/** Makes or upgrades the job tables and queues. Part of migrating. */
export async function prepareQueues(): Promise<void> {
  const boss = createBoss({ supervise: false })
  boss.on('error', () => {})
  await boss.start()
  try {
    for (const [name, options] of Object.entries(QUEUES)) {
      const queue = { name, retryBackoff: true, ...options }
      if (await boss.getQueue(name)) await boss.updateQueue(name, queue)
      else await boss.createQueue(name, queue)
    }
  } finally {
    await boss.stop({ graceful: false })
  }
}
