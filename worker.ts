import type PgBoss from 'pg-boss'

import { createBoss } from '@/lib/jobs/boss'
import { SCHEDULES } from '@/lib/jobs/handlers'
import { QUEUES, type JobName } from '@/lib/jobs/queue'
import { runJob } from '@/lib/jobs/run-job'
import { logger } from '@/lib/logger'
import { warmUpReading } from '@/lib/photographs/warm-up'
import { sequelize } from '@/models'

/** How long jobs under way may take to end once the process is told to stop, in milliseconds. */
const GRACE = 20_000

async function workOff(boss: PgBoss, name: JobName): Promise<void> {
  await boss.work<object>(
    name,
    { batchSize: 1, pollingIntervalSeconds: 0.5, includeMetadata: true },
    ([job]) => runJob(name, job!),
  )
}

/** The job process: takes work from every queue until it is told to stop. */
async function main(): Promise<void> {
  const boss = createBoss({ supervise: true })
  boss.on('error', (error) => logger().error({ err: error }, 'queue'))
  await boss.start()
  await warmUpReading()
  for (const name of Object.keys(QUEUES) as JobName[]) await workOff(boss, name)
  for (const [name, cron] of Object.entries(SCHEDULES)) await boss.schedule(name, cron)
  logger().info('jobs ready')

  let stopping = false
  const stop = async () => {
    if (stopping) return
    stopping = true
    setTimeout(() => process.exit(1), GRACE + 2_000).unref()
    await boss.stop({ graceful: true, timeout: GRACE })
    await sequelize().close()
    process.exit(0)
  }
  for (const signal of ['SIGTERM', 'SIGINT'] as const) process.on(signal, () => void stop())
}

// Whatever starts this process starts it again.
main().catch((error: unknown) => {
  logger().fatal({ err: error }, 'jobs stopped')
  process.exit(1)
})
