import { buildKit, failKit } from '@/lib/kits/build-kit'

import type { JobHandler } from './handlers'

/** Builds a kit; after the last try in vain the kit says so and can be built again. */
export const buildKitJob: JobHandler<'build-kit'> = async ({ kitId }, { isLastTry }) => {
  try {
    await buildKit(kitId)
  } catch (error) {
    if (isLastTry) {
      await failKit(
        kitId,
        'It could not be built just now: a service we need did not answer. Build the kit again.',
      )
    }
    throw error
  }
}
