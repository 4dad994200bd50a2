/** What every route handler does around its own work: who asks, from where, how much, and what goes wrong. */
import 'server-only'
import { getDb } from '@/db/client'
import { AppError } from '@/lib/errors'
import type { z } from '@/lib/zod'
import type { Anonymous, Context } from '../context'
import { readActor } from '../people/session'
import { failureOf } from './failure'
import { parseInput } from './parse'
import { readJson, readText } from './read-body'
import { refuseCrossSite } from './same-site'

const MAX_BYTES = 1024 * 1024

/** Params as Next hands them over; a handler names the ones of its folder. */
type Params = Record<string, string>

interface Asked<P extends Params, B> {
  request: Request
  params: P
  /** Query string values. */
  query: URLSearchParams
  /** The parsed body; undefined for GET. */
  body: B
}

interface Options<S extends z.ZodType> {
  /** Schema of the JSON body. Without it the handler is given JSON as unknown. */
  schema?: S
  /** 'text' gives the body unparsed, 'none' leaves it to the handler. */
  body?: 'json' | 'text' | 'none'
  /** Longest body, bytes; 1 MiB unless told. */
  maxBytes?: number
}

type RouteArgs<P> = { params: Promise<P> }

const isReading = (request: Request) => request.method === 'GET' || request.method === 'HEAD'

async function bodyOf(request: Request, { schema, body = 'json', maxBytes = MAX_BYTES }: Options<z.ZodType>): Promise<unknown> {
  if (isReading(request) || body === 'none') return undefined
  if (body === 'text') return readText(request, maxBytes)
  const json = await readJson(request, maxBytes)
  return schema ? parseInput(schema, json) : json
}

/** Answers about one person's data: not to be kept by anyone between, nor read as another type. */
function sealed(response: Response): Response {
  if (!response.headers.has('cache-control')) response.headers.set('cache-control', 'no-store')
  response.headers.set('x-content-type-options', 'nosniff')
  return response
}

async function answer(request: Request, work: () => Promise<unknown>): Promise<Response> {
  try {
    if (!isReading(request)) refuseCrossSite(request)
    const value = await work()
    return sealed(value instanceof Response ? value : Response.json(value ?? {}))
  } catch (error) {
    const { status, body } = failureOf(error, `${request.method} ${new URL(request.url).pathname}`)
    return sealed(Response.json(body, { status }))
  }
}

/**
 * A route handler for someone signed in. Refuses cross-site changes, reads and judges the body, and answers what
 * the handler returns: a Response as it is, anything else as JSON. AppErrors become their status and an ErrorBody;
 * anything else is logged and answered as a fault. Authorisation is the operation's own.
 * @example export const POST = route(({ context, params, body }) => saveEdits(context, { facadeId: params.id, ...body }), { schema })
 */
export function route<P extends Params = Params, S extends z.ZodType = z.ZodUnknown>(
  handler: (asked: Asked<P, z.infer<S>> & { context: Context }) => unknown,
  options: Options<S> = {},
) {
  return (request: Request, { params }: RouteArgs<P>): Promise<Response> =>
    answer(request, async () => {
      const actor = await readActor()
      if (!actor) throw new AppError('signed-out')
      const body = (await bodyOf(request, options)) as z.infer<S>
      const context: Context = { db: getDb(), actor, now: Date.now() }
      return handler({ context, request, params: await params, query: new URL(request.url).searchParams, body })
    })
}

/** The same for anyone, signed in or not. */
export function publicRoute(handler: (asked: { request: Request; context: Anonymous }) => unknown) {
  return (request: Request): Promise<Response> =>
    answer(request, async () => handler({ request, context: { db: getDb(), now: Date.now() } }))
}
