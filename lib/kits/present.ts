import type { Actor } from '@/lib/auth/actor'
import { screenColor } from '@/lib/color/gamut'
import type { Lane } from '@/lib/combinations/constants'
import { shadeLabel } from '@/lib/shades/present'
import type { Combination } from '@/models'
import type { KitLeftOut } from '@/models/Kit'

import { isUnbuilt, type KitState } from './constants'
import { isShown, reasonsAgainst } from './fitness'
import { canDeleteKits } from './policy'
import type { BuiltKit } from './queries'

/** A combination that a kit could be built of, as the form shows it. */
export interface KitCandidate {
  id: string
  title: string
  lane: Lane
  /** From top to bottom, without empty places. */
  bands: { hex: string; share: number; name: string }[]
  /** Why it cannot go in; empty when it can. */
  reasons: string[]
  /** What one should know although it can go in. */
  note: string | null
}

/** A combination as the kit's form shows it. */
export function presentCandidate(combination: Combination): KitCandidate {
  const { id, title, lane, places = [], photograph } = combination
  const reasons = reasonsAgainst(combination)
  const hidden = photograph && !isShown(photograph) && reasons.length === 0
  return {
    id,
    title,
    lane,
    bands: places.flatMap(({ shade, share }) =>
      shade
        ? {
            hex: screenColor([shade.labL, shade.labA, shade.labB]).hex,
            share,
            name: shadeLabel(shade),
          }
        : [],
    ),
    reasons,
    note: hidden
      ? 'Its photograph stays out of the pictures: its licence may not allow copies.'
      : null,
  }
}

/** A kit as a list shows it. */
export interface KitView {
  id: string
  state: KitState
  /** It was built, and its file is removed since. */
  expired: boolean
  done: number
  total: number
  failure: string | null
  /** ISO 8601. */
  askedAt: string
  /** Null when that person's account is gone. */
  askedBy: string | null
  /** When its file is, or was, removed; ISO 8601. */
  expiresAt: string | null
  byteLength: number | null
  selection: string[]
  /** How many combinations are in it, or are meant to be. */
  count: number
  leftOut: KitLeftOut[]
  canDelete: boolean
}

/** A kit row as its view. */
export function presentKit(actor: Actor, { kit, askedBy }: BuiltKit): KitView {
  const { id, state, done, total, failure, createdAt, expiresAt, byteLength } = kit
  const { selection, leftOut } = kit
  return {
    id,
    state,
    expired:
      state === 'ready' && (kit.objectKey === null || (expiresAt?.getTime() ?? 0) <= Date.now()),
    done,
    total,
    failure,
    askedAt: createdAt.toISOString(),
    askedBy,
    expiresAt: expiresAt?.toISOString() ?? null,
    byteLength,
    selection,
    count: isUnbuilt(state) ? selection.length : selection.length - leftOut.length,
    leftOut,
    canDelete: canDeleteKits(actor),
  }
}

/** A combination within a kit, with its texts and where its pictures are shown. */
export interface KitEntryView {
  id: string
  title: string
  alt: string
  caption: string
  html: string
  pictures: { src: string; width: number; height: number }[]
}

/** What a kit holds, as its page shows it. */
export const presentKitEntries = (actor: Actor, { kit }: BuiltKit): KitEntryView[] =>
  kit.contents.map(({ id, title, alt, caption, html, pictures }) => ({
    id,
    title,
    alt,
    caption,
    html,
    pictures: pictures.map(({ width, height }) => ({
      src: `/api/brands/${actor.brandSlug}/kits/${kit.id}/pictures/${id}-${width}x${height}.png`,
      width,
      height,
    })),
  }))
