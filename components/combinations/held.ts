/** What is in the hand: a shade of the tray, or what stands in a place (from 0). */
export type Held = { kind: 'shade'; shadeId: string } | { kind: 'place'; place: number }

/** The name of what is held, for dragging. */
export const heldId = (held: Held): string =>
  held.kind === 'shade' ? `shade ${held.shadeId}` : `place ${held.place}`
