import { allow } from '@/lib/auth/actor'

/** Sees the line's photographs and what was read from them. */
export const canReadPhotographs = allow('owner', 'marketer', 'designer')
/** Changes what is said about a photograph: title, photographer, licence, alt text. */
export const canEditPhotograph = allow('owner', 'marketer', 'designer')
/** Adds photographs. */
export const canUploadPhotographs = allow('owner', 'designer')
/** Deletes photographs and brings them back. */
export const canDeletePhotographs = allow('owner', 'designer')
/** Has a photograph read again. */
export const canRereadPhotograph = allow('owner', 'designer')
