import type { NextRequest } from 'next/server'
import { z } from 'zod'

import type { Actor } from '@/lib/auth/actor'
import { getActor } from '@/lib/auth/get-actor'
import { HTTP_STATUS, InvalidError, type Failure } from '@/lib/errors'

import { failureOf } from './map-error'
import { requireSameOrigin } from './same-origin'

type Params = { brand: string } & Record<string, string>

const PRIVATE = { 'Cache-Control': 'private, no-store' }

/**
 * Makes a route handler under /api/brands/[brand] of a query or command: session → parse → work →
 * answer. The input is the address's parameters, the query string and, for writes, the JSON body,
 * in that order of precedence. A Response is passed on as it is; anything else becomes JSON.
 */
export function defineRoute<Schema extends z.ZodType>(
  schema: Schema,
  work: (actor: Actor, input: z.output<Schema>, request: NextRequest) => Promise<unknown>,
): (request: NextRequest, context: { params: Promise<Params> }) => Promise<Response> {
  return async (request, { params }) => {
    try {
      const writes = request.method !== 'GET' && request.method !== 'HEAD'
      if (writes) requireSameOrigin(request.headers)
      const { brand, ...rest } = await params
      const actor = await getActor(brand)
      const query = Object.fromEntries(request.nextUrl.searchParams)
      const body = writes ? await readJson(request) : {}
      const answer = await work(actor, schema.parse({ ...body, ...query, ...rest }), request)
      return answer instanceof Response
        ? answer
        : Response.json(answer ?? null, { headers: PRIVATE })
    } catch (error) {
      return failureResponse(failureOf(error, `${request.method} ${request.nextUrl.pathname}`))
    }
  }
}

async function readJson(request: NextRequest): Promise<object> {
  const text = await request.text()
  if (text === '') return {}
  try {
    return z.looseObject({}).parse(JSON.parse(text))
  } catch {
    throw new InvalidError('The request is not JSON.')
  }
}

/** A failure as JSON with the status that fits its code. */
export function failureResponse(failure: Failure): Response {
  const status = failure.code === 'unexpected' ? 500 : HTTP_STATUS[failure.code]
  return Response.json(failure, { status, headers: PRIVATE })
}
