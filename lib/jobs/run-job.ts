import type PgBoss from 'pg-boss'

import { logger } from '@/lib/logger'
import { withinScope } from '@/models/scope'

import { HANDLERS, type JobHandler } from './handlers'
import { QUEUES, type JobName } from './queue'

/** Does one job, under the id of the request it came from, and logs how it ended. */
export async function runJob(
  name: JobName,
  job: Pick<PgBoss.JobWithMetadata<object>, 'id' | 'data' | 'retryCount'>,
): Promise<void> {
  const started = performance.now()
  // A job of the schedule has no data.
  const { requestId, ...data } = (job.data ?? {}) as { requestId?: string }
  const log = logger().child({ job: name, id: job.id, data, requestId })
  try {
    const isLastTry = job.retryCount >= QUEUES[name].retryLimit
    const handle = HANDLERS[name] as JobHandler<JobName>
    const result = await withinScope({ requestId }, () => handle(data as never, { isLastTry }))
    log.info({ result, ms: Math.round(performance.now() - started) }, 'job done')
  } catch (error) {
    log.warn({ err: error, retryCount: job.retryCount }, 'job failed')
    throw error
  }
}
