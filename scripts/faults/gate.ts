import { connect, createServer, type Server, type Socket } from 'node:net'

/** A connection through a gate: `near` is who came, `far` what it leads to. */
interface Pair {
  near: Socket
  far: Socket
}

/**
 * What a gate does with bytes on their way: passes on what is returned. `out` goes to the service,
 * `back` to who asked.
 */
export type Tamper = (way: 'out' | 'back', chunk: Buffer, cut: () => void) => Buffer | null

/** A TCP proxy on the loopback that can refuse, freeze, cut, or look into what passes. */
export class Gate {
  #server: Server | undefined
  #pairs = new Set<Pair>()
  #frozen = false
  #tamper: Tamper | undefined

  private constructor(
    readonly target: number,
    public port: number,
  ) {}

  /** Opens a gate to a port of the loopback, on a free port. */
  static async open(target: number): Promise<Gate> {
    const gate = new Gate(target, 0)
    await gate.admit()
    return gate
  }

  /** Takes connections (again). */
  async admit(): Promise<void> {
    if (this.#server) return
    const server = createServer((near) => this.#join(near))
    await new Promise<void>((done, fail) => {
      server.once('error', fail)
      server.listen(this.port, '127.0.0.1', done)
    })
    this.port = (server.address() as { port: number }).port
    this.#server = server
  }

  /** Cuts every connection and refuses new ones. */
  async refuse(): Promise<void> {
    const server = this.#server
    this.#server = undefined
    const closed = new Promise((done) => (server ? server.close(done) : done(undefined)))
    this.cut()
    await closed
  }

  /** Cuts every connection; new ones are taken. */
  cut(): void {
    for (const pair of this.#pairs) this.#end(pair)
  }

  /** Takes connections and bytes, and passes nothing on. */
  freeze(): void {
    this.#frozen = true
    for (const pair of this.#pairs) for (const socket of Object.values(pair)) socket.pause()
  }

  /** Passes on what waited, and all else. */
  thaw(): void {
    this.#frozen = false
    for (const pair of this.#pairs) for (const socket of Object.values(pair)) socket.resume()
  }

  /** Looks into what passes from now on; undefined: no longer. */
  tamper(tamper: Tamper | undefined): void {
    this.#tamper = tamper
  }

  #join(near: Socket): void {
    const pair: Pair = { near, far: connect(this.target, '127.0.0.1') }
    this.#pairs.add(pair)
    this.#pass(pair, pair.near, pair.far, 'out')
    this.#pass(pair, pair.far, pair.near, 'back')
  }

  #pass(pair: Pair, from: Socket, to: Socket, way: 'out' | 'back'): void {
    from.setNoDelay(true)
    from.on('data', (chunk) => {
      const passed = this.#tamper ? this.#tamper(way, chunk, () => this.#end(pair)) : chunk
      if (passed && !to.destroyed) to.write(passed)
    })
    from.on('end', () => to.end())
    from.on('error', () => this.#end(pair))
    from.on('close', () => this.#end(pair))
    if (this.#frozen) from.pause()
  }

  #end(pair: Pair): void {
    this.#pairs.delete(pair)
    for (const socket of Object.values(pair) as Socket[]) {
      if (!socket.destroyed) socket.resetAndDestroy()
    }
  }
}
