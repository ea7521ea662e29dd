import { allow } from '@/lib/auth/actor'

/** Reads the brand's activity record and takes it away as CSV. */
export const canReadActivity = allow('owner')
