/** An address within Woadmap that a link asks to go on to; the front door when it is none of ours. */
export const ownAddress = (next: string | string[] | undefined): string =>
  typeof next === 'string' && /^\/(?![/\\])[\w\-./?=&%]*$/.test(next) ? next : '/'
