import { sweepKits } from '@/lib/kits/sweep'
import { sendLetter, sendLetters } from '@/lib/mail/send-letters'
import { freezeDueNames } from '@/lib/names/freeze-due-names'
import { tellDecisions } from '@/lib/names/tell-decisions'
import { sweepPeople } from '@/lib/people/sweep'
import { copyPhotograph } from '@/lib/photographs/read-photograph'
import { sweepUploads } from '@/lib/photographs/sweep'

import { buildKitJob } from './build-kit.job'
import type { JobData, JobName } from './queue'
import { readPhotographJob } from './read-photograph.job'

/** Does a job. What it returns is logged; what it throws has the job tried again. */
export type JobHandler<Name extends JobName> = (
  data: JobData[Name],
  job: { isLastTry: boolean },
) => Promise<unknown>

/** The handler of each queue. */
export const HANDLERS: { [Name in JobName]: JobHandler<Name> } = {
  'read-photograph': readPhotographJob,
  'copy-photograph': ({ photographId }) => copyPhotograph(photographId),
  'sweep-uploads': () => sweepUploads(),
  'send-letter': ({ letterId }) => sendLetter(letterId),
  'send-letters': () => sendLetters(),
  'sweep-people': () => sweepPeople(),
  'build-kit': buildKitJob,
  'sweep-kits': () => sweepKits(),
  'tell-decisions': () => tellDecisions(),
  'freeze-names': () => freezeDueNames(),
}

/** When the jobs that nobody asks for are done. @see crontab(5) */
export const SCHEDULES: Partial<Record<JobName, string>> = {
  'sweep-uploads': '*/5 * * * *',
  'send-letters': '* * * * *',
  'sweep-people': '17 * * * *',
  'sweep-kits': '*/15 * * * *',
  'tell-decisions': '* * * * *',
  'freeze-names': '1 * * * *',
}
