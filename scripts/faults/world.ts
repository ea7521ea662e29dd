import { randomUUID } from 'node:crypto'
import { setTimeout as sleep } from 'node:timers/promises'

import pg from 'pg'

import { LINE_FORM } from '@/tests/fixtures/line-form'

import { startJobs, startWeb } from '../lib/product.mjs'
import type { Fleet } from '../lib/processes.mjs'

import { must } from './fault'
import { Gate } from './gate'
import { Visitor } from './visitor'

type Env = Record<string, string>

/** What a run stands on: the services and the build are there, the product is not started yet. */
export interface Ground {
  fleet: Fleet
  env: Env
  port: number
  local: string
  dist: string
}

/** The product must answer within this, whatever happens, in milliseconds. */
export const PATIENCE = 4_000
/** The product must be ready this long after a repair, in milliseconds. */
const RECOVERY = 10_000
/** One step of undoing a fault is waited for so long, in milliseconds. */
const UNDOING = 15_000

/** The demo's first brand. */
export const BRAND = 'teasel-and-tarn'
/** The demo's line, which has shades enough to match photographs. */
export const LINE = 'heronsway-dk'
/** The line that the faults write their shades to. */
export const FAULT_LINE = 'line-of-bad-days'

/** The running product, what stands between it and its services, and who visits it. */
export class World {
  readonly #undo: (() => unknown)[] = []
  readonly #acknowledged = new Map<string, { table: string; id: string; values: object }>()
  #visitors: Visitor[] = []
  #number = 0
  owner!: Visitor
  designer!: Visitor

  private constructor(
    readonly ground: Ground,
    /** What stands before each service: for the web, for the jobs, for browsers. */
    readonly gates: {
      webDatabase: Gate
      jobsDatabase: Gate
      webStore: Gate
      jobsStore: Gate
      browserStore: Gate
      mail: Gate
    },
  ) {}

  /** Starts the product behind gates, signs its visitors in, and makes the line of the faults. */
  static async open(ground: Ground): Promise<World> {
    const { DATABASE_URL, S3_ENDPOINT, SMTP_URL } = ground.env
    const gateTo = (url: string | undefined) => Gate.open(Number(new URL(url!).port))
    const world = new World(ground, {
      webDatabase: await gateTo(DATABASE_URL),
      jobsDatabase: await gateTo(DATABASE_URL),
      webStore: await gateTo(S3_ENDPOINT),
      jobsStore: await gateTo(S3_ENDPOINT),
      browserStore: await gateTo(S3_ENDPOINT),
      mail: await gateTo(SMTP_URL),
    })
    await world.startJobs()
    await world.startWeb()
    world.owner = await world.visitor().signIn('owner')
    world.designer = await world.visitor().signIn('designer')
    const made = await world.owner.act('createLineAction', `/${BRAND}/lines/new`, {
      ...LINE_FORM,
      name: 'Line of Bad Days',
      requestKey: randomUUID(),
    })
    must(made.ok, 'the line of the faults could not be made')
    return world
  }

  /** Somebody new, not signed in. */
  visitor(): Visitor {
    const visitor = new Visitor(this.ground.port, this.ground.dist)
    this.#visitors.push(visitor)
    return visitor
  }

  /** Starts the web server, from another build when one is named. */
  async startWeb(dist = this.ground.dist): Promise<void> {
    const env = {
      ...this.ground.env,
      WOADMAP_DIST_DIR: dist,
      DATABASE_WEB_URL: through(this.gates.webDatabase, this.ground.env.DATABASE_WEB_URL!),
      S3_ENDPOINT: through(this.gates.webStore, this.ground.env.S3_ENDPOINT!),
      S3_PUBLIC_ENDPOINT: through(this.gates.browserStore, this.ground.env.S3_ENDPOINT!),
      SMTP_URL: through(this.gates.mail, this.ground.env.SMTP_URL!),
    }
    await startWeb(this.ground.fleet, env, { host: '127.0.0.1', port: this.ground.port })
  }

  /** Starts the job process. */
  async startJobs(more: Env = {}): Promise<void> {
    await startJobs(this.ground.fleet, {
      ...this.ground.env,
      DATABASE_URL: through(this.gates.jobsDatabase, this.ground.env.DATABASE_URL!),
      S3_ENDPOINT: through(this.gates.jobsStore, this.ground.env.S3_ENDPOINT!),
      SMTP_URL: through(this.gates.mail, this.ground.env.SMTP_URL!),
      ...more,
    })
  }

  /** Asks the database itself, past every gate. */
  async query<Row = Record<string, unknown>>(text: string, values?: unknown[]): Promise<Row[]> {
    const client = await this.#connect()
    try {
      return (await client.query(text, values)).rows as Row[]
    } finally {
      await client.end()
    }
  }

  /** How many rows a query of one `n` counts. */
  async count(from: string, values?: unknown[]): Promise<number> {
    const [row] = await this.query<{ n: number }>(`SELECT count(*)::int AS n FROM ${from}`, values)
    return row!.n
  }

  /** Does something in a transaction and keeps it open, with its locks, until let go or undone. */
  async hold(statement: string, values?: unknown[]): Promise<() => Promise<void>> {
    const client = await this.#connect()
    await client.query('BEGIN')
    await client.query(statement, values)
    const letGo = () => client.end().catch(() => {})
    this.undo(letGo)
    return letGo
  }

  async #connect(): Promise<pg.Client> {
    const client = new pg.Client({
      connectionString: this.ground.env.DATABASE_URL,
      connectionTimeoutMillis: 3_000,
      query_timeout: 30_000,
      application_name: 'faults',
    })
    client.on('error', () => {})
    await client.connect()
    return client
  }

  /** Waits until so many of the web's statements wait for a lock. */
  waitForLocked(atLeast: number): Promise<unknown> {
    return until(`${atLeast} statements wait for the lock`, async () => {
      return (await this.count('pg_locks WHERE NOT granted')) >= atLeast
    })
  }

  /** To be undone when the fault has been looked at, the last given first; twice does no harm. */
  undo(step: () => unknown): void {
    this.#undo.push(step)
  }

  /** Undoes what is left to undo, and starts what a fault that missed has left stopped. */
  async mend(): Promise<void> {
    for (let step; (step = this.#undo.pop());) {
      await Promise.race([step(), sleep(UNDOING, undefined, { ref: false })])
    }
    const { fleet } = this.ground
    if (!fleet.isRunning('jobs')) await this.startJobs()
    if (!fleet.isRunning('web')) await this.startWeb()
  }

  /**
   * Waits until the product says that it is ready.
   * @returns after how long, in milliseconds
   * @throws Missed when that takes longer than it may
   */
  async healthy(): Promise<number> {
    const began = performance.now()
    const asker = new Visitor(this.ground.port, this.ground.dist)
    while (performance.now() - began < RECOVERY) {
      const answer = await asker.ask('/readyz').catch(() => undefined)
      if (answer?.status === 200) return performance.now() - began
      await sleep(100)
    }
    must(false, `not ready ${RECOVERY / 1000} s after the repair`)
    return RECOVERY
  }

  /** Notes a row that the product said was saved: it must be there, so, to the end of the run. */
  acknowledge(table: string, id: string, values: object = {}): void {
    this.#acknowledged.set(`${table} ${id}`, { table, id, values })
  }

  /** Forgets a row that is to be gone. */
  forget(table: string, id: string): void {
    this.#acknowledged.delete(`${table} ${id}`)
  }

  /** The acknowledged rows that are not there as they were acknowledged. */
  async lost(): Promise<string[]> {
    const lost: string[] = []
    for (const { table, id, values } of this.#acknowledged.values()) {
      const [row] = await this.query(`SELECT * FROM ${table} WHERE id = $1`, [id])
      const differs = Object.entries(values).filter(([name, value]) => row?.[name] !== value)
      if (!row) lost.push(`${table} ${id} is gone`)
      for (const [name] of differs) lost.push(`${table} ${id} has another ${name}`)
    }
    return lost
  }

  /** Every answer since the last time this was asked. */
  takeWaits(): { what: string; ms: number }[] {
    return this.#visitors.flatMap(({ waits }) => waits.splice(0))
  }

  /** A new shade's form for the line of the faults. */
  newShade(requestKey: string = randomUUID()) {
    const number = `B${++this.#number}`
    return {
      lineSlug: FAULT_LINE,
      number,
      name: `Bad day ${number}`,
      status: 'target' as const,
      color: { kind: 'hex', hex: '#7a8b4f' },
      requestKey,
    }
  }

  /** Saves a new shade; when it is acknowledged, it is noted. */
  async saveShade(
    shade = this.newShade(),
    { by = this.owner, signal = undefined as AbortSignal | undefined } = {},
  ) {
    const answer = await by.act<{ id: string }>(
      'createShadeAction',
      `/${BRAND}/lines/${FAULT_LINE}/shades/new`,
      shade,
      signal && { signal },
    )
    if (answer.ok) {
      this.acknowledge('shades', answer.data.id, { number: shade.number })
    }
    return answer
  }

  /** How many shades there are with the number of this one. */
  countShades({ number }: { number: string }): Promise<number> {
    return this.count('shades WHERE number = $1', [number])
  }

  /** A small photograph that nobody has seen before. */
  async newPicture(): Promise<Buffer> {
    // Not before the settings are there.
    const { makePicture } = await import('@/tests/factories/photograph')
    return makePicture()
  }
}

const through = (gate: Gate, url: string): string => {
  const address = new URL(url)
  address.hostname = '127.0.0.1'
  address.port = String(gate.port)
  return address.toString().replace(/\/$/, '')
}

/**
 * Looks again and again until it is so.
 * @param within seconds
 * @returns after how long, in milliseconds
 * @throws Missed naming what did not come
 */
export async function until(
  what: string,
  isSo: () => Promise<boolean> | boolean,
  within = 10,
): Promise<number> {
  const began = performance.now()
  while (performance.now() - began < within * 1000) {
    if (await isSo()) return performance.now() - began
    await sleep(100)
  }
  must(false, `after ${within} s still not: ${what}`)
  return within
}

/** Milliseconds in words: "0.4 s". */
export const seconds = (ms: number): string => `${(ms / 1000).toFixed(1)} s`
