import type { NextRequest } from 'next/server'
import { z } from 'zod'

import { asActor, type Actor } from '@/lib/auth/actor'
import { getActor } from '@/lib/auth/get-actor'
import { HTTP_STATUS, InvalidError, type Failure } from '@/lib/errors'
import { withinScope } from '@/models/scope'

import { gatherInput } from './gather-input'
import { failureOf } from './map-error'
import { recordRefusals } from './record-refusals'
import { requestIdOf } from './request'
import { requireSameOrigin } from './same-origin'

type Params = { brand: string } & Record<string, string>

const PRIVATE = { 'Cache-Control': 'private, no-store' }

/**
 * Makes a route handler under /api/brands/[brand] of a query or command: session → parse → work →
 * answer. The input is the address's parameters, the query string and, for writes, the JSON body; a
 * field may come once. A Response is passed on as it is; anything else becomes JSON.
 * @param name what is asked for, for the log and the activity record
 */
export function defineRoute<Schema extends z.ZodType>(
  name: string,
  schema: Schema,
  work: (actor: Actor, input: z.output<Schema>, request: NextRequest) => Promise<unknown>,
): (request: NextRequest, context: { params: Promise<Params> }) => Promise<Response> {
  const answer = async (request: NextRequest, { params }: { params: Promise<Params> }) => {
    try {
      const writes = request.method !== 'GET' && request.method !== 'HEAD'
      if (writes) requireSameOrigin(request.headers)
      const { brand, ...rest } = await params
      const actor = await getActor(brand)
      const body = writes ? await readJson(request) : {}
      const input = schema.parse(gatherInput(rest, request.nextUrl.searchParams, body))
      const result = await asActor(actor, () =>
        recordRefusals(actor, { asked: name }, () => work(actor, input, request)),
      )
      return result instanceof Response
        ? result
        : Response.json(result ?? null, { headers: PRIVATE })
    } catch (error) {
      return failureResponse(failureOf(error, name))
    }
  }
  return (request, context) =>
    withinScope({ requestId: requestIdOf(request.headers) }, () => answer(request, context))
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
  const { retryAfter } = failure
  const headers = { ...PRIVATE, ...(retryAfter && { 'Retry-After': String(retryAfter) }) }
  return Response.json(failure, { status, headers })
}
