import { fork, type ChildProcess } from 'node:child_process'
import { fileURLToPath } from 'node:url'

import type { Area } from './compose'

/** Drawings that share a photograph, each with its place for it. */
export interface Drawings {
  drawings: readonly { svg: string; area: Area | null }[]
  photograph: Buffer | null
}

/** Raw pixels: n×3 row-major sRGB 0–255. */
export interface Pixels {
  data: Buffer
  width: number
  height: number
}

/** Pictures of drawings. */
export interface Pictures {
  /** PNG, one pixel a unit, without an alpha channel. */
  pictures: Buffer[]
  /** A JPEG of the photograph as the first drawing shows it. */
  photograph: Buffer | null
}

interface Answer {
  id: number
  result?: unknown
  error?: string
}

interface Asked {
  resolve: (result: unknown) => void
  reject: (error: Error) => void
}

/** How long the pictures of one combination may take, in milliseconds. */
const PATIENCE = 60_000

const bufferOf = ({ buffer, byteOffset, byteLength }: Uint8Array) =>
  Buffer.from(buffer, byteOffset, byteLength)

/** Makes pictures of drawings in a process of its own; to be closed. */
export class Rasteriser {
  private readonly child: ChildProcess
  private readonly asked = new Map<number, Asked>()
  private next = 0

  constructor() {
    this.child = fork(fileURLToPath(new URL('./rasterise-child.mjs', import.meta.url)), {
      serialization: 'advanced',
      execArgv: [],
      stdio: ['ignore', 'inherit', 'inherit', 'ipc'],
    })
    this.child.on('message', ({ id, result, error }: Answer) => {
      const asked = this.asked.get(id)
      this.asked.delete(id)
      if (error === undefined) asked?.resolve(result)
      else asked?.reject(new Error(`A picture could not be drawn: ${error}`))
    })
    this.child.on('error', (error) => this.fail(error))
    this.child.on('exit', (code) => this.fail(new Error(`The drawing process ended (${code}).`)))
  }

  private fail(error: Error): void {
    for (const { reject } of this.asked.values()) reject(error)
    this.asked.clear()
  }

  private async ask<Result>(work: string, request: object): Promise<Result> {
    const id = this.next++
    const late = setTimeout(() => this.close(), PATIENCE)
    try {
      const answer = new Promise<unknown>((resolve, reject) => {
        this.asked.set(id, { resolve, reject })
      })
      if (this.child.connected) this.child.send({ id, work, ...request })
      else this.fail(new Error('The drawing process has ended.'))
      return (await answer) as Result
    } finally {
      clearTimeout(late)
    }
  }

  /** Drawings as pictures. @throws Error when one cannot be drawn */
  async pictures(drawings: Drawings): Promise<Pictures> {
    type Raw = { pictures: Uint8Array[]; photograph: Uint8Array | null }
    const { pictures, photograph } = await this.ask<Raw>('pictures', drawings)
    return {
      pictures: pictures.map(bufferOf),
      photograph: photograph && bufferOf(photograph),
    }
  }

  /** What {@link pictures} encodes, as raw pixels. */
  async pixels(drawings: Drawings): Promise<Buffer[]> {
    return (await this.ask<Uint8Array[]>('pixels', drawings)).map(bufferOf)
  }

  /** Raw pixels as PNG, encoded as {@link pictures} does. */
  async encode(pixels: readonly Pixels[]): Promise<Buffer[]> {
    return (await this.ask<Uint8Array[]>('encode', { pixels })).map(bufferOf)
  }

  /** Ends the process. */
  close(): void {
    this.child.kill()
  }
}
