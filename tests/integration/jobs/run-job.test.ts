import { randomUUID } from 'node:crypto'

import { describe, expect, it } from 'vitest'

import { SCHEDULES } from '@/lib/jobs/handlers'
import { QUEUES, type JobName } from '@/lib/jobs/queue'
import { runJob } from '@/lib/jobs/run-job'

const job = (data: object | null) => ({ id: randomUUID(), data: data as object, retryCount: 0 })

describe('a job', () => {
  it.each(Object.keys(SCHEDULES) as JobName[])(
    'of the schedule, %s, is done without data',
    (name) => expect(runJob(name, job(null))).resolves.toBeUndefined(),
  )

  it('that cannot be done is handed back to the queue', async () => {
    await expect(runJob('read-photograph', job({ photographId: 'no id at all' }))).rejects.toThrow()
  })

  it('has a queue for every schedule', () => {
    expect(Object.keys(QUEUES)).toEqual(expect.arrayContaining(Object.keys(SCHEDULES)))
  })
})
