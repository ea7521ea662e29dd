import type { Instrumentation } from 'next'

import { logger } from '@/lib/logger'

import { REQUEST_ID_HEADER } from './request'

/**
 * Logs what a page could not be drawn for, under the digest that its error page shows as a
 * reference.
 */
export const logRequestError: Instrumentation.onRequestError = (error, request, context) => {
  const { digest } = error as { digest?: string }
  logger().error(
    {
      err: error,
      where: `${context.routeType} ${context.routePath}`,
      reference: digest,
      requestId: request.headers[REQUEST_ID_HEADER],
    },
    'unexpected error',
  )
}
