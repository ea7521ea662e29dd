import { randomUUID } from 'node:crypto'
import { subscribe } from 'node:diagnostics_channel'
import type { IncomingMessage, ServerResponse } from 'node:http'
import type { Socket } from 'node:net'

import { logger } from '@/lib/logger'

import { PATH_HEADER, PEER_HEADER, REQUEST_ID_HEADER } from './request'

interface Started {
  request: IncomingMessage
  response: ServerResponse
  socket: Socket
}

/** What is asked for all day long and says nothing. */
const QUIET = /^\/(_next\/static|livez|readyz|icon|favicon)/

/**
 * What the log keeps of an address: no query, and no token of a link in a letter, since whoever has
 * one may use it. It also travels as a header, and so stays within ASCII.
 */
export const loggedPath = (url: string): string => url.split('?')[0]!.replace(/[\w-]{43,}/g, '*')

/**
 * Gives every request its id, its path and the address it truly came from, over whatever headers of
 * those names it carries, before anything else sees it; and logs a line when it has been answered.
 * By Node.js's own channel, since Next.js keeps its server to itself.
 */
export function watchRequests(): void {
  subscribe('http.server.request.start', (message) => {
    const { request, response, socket } = message as Started
    const requestId = randomUUID()
    const started = performance.now()
    request.headers[REQUEST_ID_HEADER] = requestId
    request.headers[PEER_HEADER] = socket.remoteAddress ?? ''
    response.setHeader(REQUEST_ID_HEADER, requestId)
    const { method, url = '' } = request
    const path = loggedPath(url)
    request.headers[PATH_HEADER] = path
    if (QUIET.test(path)) return
    response.once('close', () => {
      const ms = Math.round(performance.now() - started)
      const status = response.writableFinished ? response.statusCode : 499
      logger().info({ requestId, method, path, status, ms }, 'request')
    })
  })
}
