import { readFileSync } from 'node:fs'
import { request, type IncomingHttpHeaders } from 'node:http'
import { join } from 'node:path'

import type { ActionResult } from '@/lib/errors'
import accounts from '@/seeders/demo-accounts.json' with { type: 'json' }

import { must } from './fault'

/** What the product answered, and after how long (milliseconds). */
export interface Answer {
  status: number
  headers: IncomingHttpHeaders
  text: string
  ms: number
}

interface Ask {
  method?: string
  headers?: Record<string, string>
  body?: string | Buffer
  /** Breaks the connection off, as a browser does whose network goes. */
  signal?: AbortSignal
}

/** Someone's browser, as far as the product can tell: cookies, origin, no patience. */
export class Visitor {
  #cookies = new Map<string, string>()
  /** Every answer so far: what was asked and how long it took, in milliseconds. */
  readonly waits: { what: string; ms: number }[] = []

  constructor(
    private readonly port: number,
    private readonly dist: string,
  ) {}

  private get origin(): string {
    return `http://localhost:${this.port}`
  }

  /** Signs in by next-auth's own endpoints, as the page does. */
  async signIn(role: string, brand = 'teasel-and-tarn'): Promise<this> {
    const account = accounts.find((one) => one.role === role && one.brand === brand)!
    const { csrfToken } = JSON.parse((await this.ask('/api/auth/csrf')).text) as {
      csrfToken: string
    }
    const { email, password } = account
    const form = new URLSearchParams({ csrfToken, email, password, json: 'true' })
    const answer = await this.ask('/api/auth/callback/credentials', {
      method: 'POST',
      headers: { 'Content-Type': 'application/x-www-form-urlencoded' },
      body: form.toString(),
    })
    must(
      answer.status === 200 &&
        [...this.#cookies.keys()].some((name) => /woadmap\.session/.test(name)),
      `${role} could not sign in (${answer.status})`,
    )
    return this
  }

  /** Asks the product over a connection of its own. Rejects when no answer came. */
  async ask(path: string, { method = 'GET', headers, body, signal }: Ask = {}): Promise<Answer> {
    const began = performance.now()
    const answer = await new Promise<Answer>((done, fail) => {
      const asked = request(
        {
          host: '127.0.0.1',
          port: this.port,
          path,
          method,
          agent: false,
          signal,
          headers: {
            Host: `localhost:${this.port}`,
            Cookie: [...this.#cookies].map(([name, value]) => `${name}=${value}`).join('; '),
            ...(method !== 'GET' && { Origin: this.origin }),
            ...(body !== undefined && { 'Content-Length': String(Buffer.byteLength(body)) }),
            ...headers,
          },
        },
        (response) => {
          const chunks: Buffer[] = []
          response.on('data', (chunk: Buffer) => chunks.push(chunk))
          response.on('error', fail)
          response.on('end', () =>
            done({
              status: response.statusCode!,
              headers: response.headers,
              text: Buffer.concat(chunks).toString(),
              ms: performance.now() - began,
            }),
          )
        },
      )
      asked.on('error', fail)
      asked.end(body)
    })
    this.waits.push({ what: `${method} ${path}`, ms: answer.ms })
    this.#keepCookies(answer.headers['set-cookie'] ?? [])
    return answer
  }

  /** Asks a route for JSON and reads what it answers. */
  async json<T = Record<string, unknown>>(
    path: string,
    method = 'GET',
    body?: unknown,
    signal?: AbortSignal,
  ): Promise<{ status: number; answer: T; ms: number }> {
    const { status, text, ms } = await this.ask(path, {
      method,
      ...(body !== undefined && { body: JSON.stringify(body) }),
      ...(signal && { signal }),
    })
    try {
      return { status, answer: JSON.parse(text) as T, ms }
    } catch {
      return { status, answer: { message: text.slice(0, 200) } as T, ms }
    }
  }

  /**
   * Calls a server action as its page does: by the id that the build gave it.
   * @param page the address the form stands on
   */
  async act<Data = Record<string, unknown>>(
    action: string,
    page: string,
    input: unknown,
    { signal, brand = 'teasel-and-tarn' }: { signal?: AbortSignal; brand?: string } = {},
  ): Promise<ActionResult<Data>> {
    const answer = await this.ask(page, {
      method: 'POST',
      headers: {
        'Next-Action': this.#idOf(action),
        Accept: 'text/x-component',
        'Content-Type': 'text/plain;charset=UTF-8',
      },
      body: JSON.stringify([brand, input]),
      ...(signal && { signal }),
    })
    const result = readActionAnswer<Data>(answer.text)
    must(result, `${action} answered ${answer.status} and no result`)
    return result
  }

  #idOf(action: string): string {
    const manifest = JSON.parse(
      readFileSync(join(this.dist, 'server/server-reference-manifest.json'), 'utf8'),
    ) as { node: Record<string, { exportedName: string }> }
    const found = Object.entries(manifest.node).find(([, one]) => one.exportedName === action)
    must(found, `the build knows no action ${action}`)
    return found[0]
  }

  #keepCookies(lines: readonly string[]): void {
    for (const line of lines) {
      const [, name, value] = /^([^=]+)=([^;]*)/.exec(line) ?? []
      if (name && value) this.#cookies.set(name, value)
      else if (name) this.#cookies.delete(name)
    }
  }
}

/** The result within an action's answer: row 0 of the stream names the row that holds it. */
function readActionAnswer<Data>(stream: string): ActionResult<Data> | undefined {
  const rowOf = (id: string) => new RegExp(`^${id}:(\\{.*)$`, 'm').exec(stream)?.[1]
  const first = rowOf('0')
  const id = first && /^\{"a":"\$@([0-9a-f]+)"/.exec(first)?.[1]
  const row = id && rowOf(id)
  return row ? (JSON.parse(row) as ActionResult<Data>) : undefined
}
