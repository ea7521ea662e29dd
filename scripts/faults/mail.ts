import { randomUUID } from 'node:crypto'
import { readdirSync, readFileSync } from 'node:fs'
import { join } from 'node:path'

import { must, type Fault } from './fault'
import { BRAND, seconds, until, type World } from './world'

/** Invites somebody new by a letter. @returns their address */
async function invite(world: World): Promise<string> {
  const email = `${randomUUID()}@guests.example`
  const answer = await world.owner.act('inviteMembersAction', `/${BRAND}/team`, {
    emails: email,
    role: 'dyer',
    requestKey: randomUUID(),
  })
  must(answer.ok, `the invitation was answered ${JSON.stringify(answer)}`)
  return email
}

/** The end of a letter, which may come in a piece of its own. @source RFC 5321 § 4.1.1.4 */
const LAST_LINE = /(^|\r\n)\.\r\n$/

/** How many letters the mail server has taken for an address. */
function arrived(world: World, email: string): number {
  const folder = join(world.ground.local, 'mail')
  const filed = readdirSync(folder).filter((name) => /^[^.].*\.json$/.test(name))
  return filed.filter((name) => readFileSync(join(folder, name), 'utf8').includes(email)).length
}

/** Waits until every try of the letter's own job has been in vain. */
const given = (world: World, email: string) =>
  until(
    'the tries of its job are spent',
    async () =>
      (await world.count(
        `pgboss.job JOIN letters ON letters.id::text = data->>'letterId'
         WHERE name = 'send-letter' AND state = 'failed' AND recipient = $1`,
        [email],
      )) === 1,
    90,
  )

/** What happens to the mail server. */
export const MAIL_FAULTS: readonly Fault[] = [
  {
    name: 'mail-down',
    what: 'the mail server is down until every try of a letter’s job is spent, as it is after ten minutes',
    expected:
      'the invitation is acknowledged at once, and its letter arrives, once, within 75 s of the repair',
    within: 240,
    async run(world) {
      const { mail } = world.gates
      await mail.refuse()
      world.undo(() => mail.admit())
      const email = await invite(world)
      const down = await given(world, email)
      must(arrived(world, email) === 0, 'a letter arrived although nothing takes letters')
      await mail.admit()
      const took = await until('the letter arrives', () => arrived(world, email) > 0, 75)
      must(arrived(world, email) === 1, 'the letter arrived more than once')
      return `its job was given up after ${seconds(down)}; the letter arrived ${seconds(took)} after the repair`
    },
  },
  {
    name: 'mail-drops',
    what: 'the mail server drops the line after it has the letter and before it says so',
    expected: 'the letter is sent again and arrives, once, within 30 s',
    async run(world) {
      const { mail } = world.gates
      let dropped = 0
      mail.tamper((way, chunk, cut) => {
        if (dropped > 0 || way !== 'out' || !LAST_LINE.test(chunk.toString('latin1'))) return chunk
        dropped++
        cut()
        return null
      })
      world.undo(() => mail.tamper(undefined))
      const email = await invite(world)
      const took = await until('the letter arrives', () => arrived(world, email) > 0, 30)
      must(dropped === 1, 'nothing was dropped')
      must(arrived(world, email) === 1, 'the letter arrived more than once')
      return `dropped once, arrived after ${seconds(took)}`
    },
  },
]
