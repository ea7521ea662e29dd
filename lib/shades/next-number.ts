import { SHADE_LIMITS } from './constants'

/**
 * Numbers for new shades that go on from those a line has: after the highest that ends in digits,
 * with what stands before them and as many digits. None is taken, whatever the case.
 */
export function nextNumbers(taken: readonly string[], count: number): string[] {
  const held = new Set(taken.map((number) => number.toLowerCase()))
  const counted = taken.flatMap((number) => {
    const parts = /^(.*?)(\d{1,9})$/.exec(number)
    return parts ? [{ before: parts[1]!, digits: parts[2]!, value: Number(parts[2]) }] : []
  })
  const last = counted.reduce((high, one) => (one.value > high.value ? one : high), {
    before: counted.length > 0 ? '' : 'T',
    digits: '',
    value: 0,
  })
  const fresh: string[] = []
  for (let value = last.value + 1; fresh.length < count; value++) {
    const digits = String(value).padStart(last.digits.length, '0')
    const number = last.before.slice(0, SHADE_LIMITS.number - digits.length) + digits
    if (!held.has(number.toLowerCase())) fresh.push(number)
  }
  return fresh
}
