const day = new Intl.DateTimeFormat('en-GB', { dateStyle: 'long', timeZone: 'UTC' })

/** "20 March 2027", of a moment or of yyyy-mm-dd. */
export const dayInWords = (at: string): string => day.format(new Date(at))
