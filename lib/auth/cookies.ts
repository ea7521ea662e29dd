/**
 * The session cookie's name. Over https it is bound to our host, to https and to the whole site.
 * @source RFC 6265bis § 4.1.3.2, the `__Host-` prefix
 */
export const sessionCookieName = (secure: boolean): string =>
  secure ? '__Host-woadmap.session' : 'woadmap.session'

/** Whether a cookie of this name holds a session of ours. */
export const isSessionCookie = (name: string): boolean => /^(__Host-)?woadmap\.session$/.test(name)
