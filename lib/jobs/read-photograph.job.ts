import { failReading, readPhotograph } from '@/lib/photographs/read-photograph'

import type { JobHandler } from './handlers'

/** Reads a photograph; after the last try in vain the photograph says so and can be read again. */
export const readPhotographJob: JobHandler<'read-photograph'> = async (
  { photographId },
  { isLastTry },
) => {
  try {
    await readPhotograph(photographId)
  } catch (error) {
    if (isLastTry) {
      await failReading(
        photographId,
        'It could not be read just now: a service we need did not answer. Read the photograph again.',
      )
    }
    throw error
  }
}
