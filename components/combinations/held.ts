/** What is in the hand: a shade of the tray, or what stands in a place (from 0). */
export type Held = { kind: 'shade'; shadeId: string } | { kind: 'place'; place: number }
