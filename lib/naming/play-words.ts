import type { Role } from './idioms'

/**
 * The trade's own words, which suit yarn of any colour. `word:roles`; a fibre after `@` means that
 * the word is offered only where the yarn holds it.
 */
const TRADE = `
  yarn:n yarns:ns skein:n skeins:ns hank:n hanks:ns ply:n,v plies:vz plied:vd,vn
  wool:n@wool wools:ns@wool woolly:j@wool woollen:j@wool worsted:n,j@wool fleece:n@wool   silk:n@silk silky:j@silk silks:ns@silk linen:n@linen flax:n@linen cotton:n@cotton
  ewe:n ewes:ns lamb:n lambs:ns ram:n rams:ns flock:n flocks:ns baa:n,v sheep:n,ns sheepless:j sheepish:j
  shear:n,v,j shears:ns,vz shorn:vn   dye:n,v dyes:ns,vz dyed:vd,vn,j,n dyeing:vg dyer:n dyers:ns vat:n vats:ns hue:n hues:ns tint:n,v tints:ns,vz
  tinted:vd,vn,j tone:n,v tones:ns shade:n,v shades:ns,vz tinge:n,v batch:n   mordant:n
  knit:n,v,vn knits:vz,ns knitted:vd,vn,j knitting:vg purl:n,v purls:ns,vz purled:vd,vn stitch:n,v
  stitches:ns,vz stitched:vd,vn seam:n,v seams:ns,vz hem:n,v hems:ns,vz sew:v sews:vz sewn:vn darn:n,v
  darned:vn,j thread:n,v threads:ns strand:n,v strands:ns twine:n,v twines:vz,ns spin:n,v spins:vz spun:vd,vn
  spool:n weave:n,v weaves:vz woven:vn,j wove:vd weaver:n loom:n,v looms:ns,vz warp:n,v weft:n felt:n tweed:n
  tweeds:ns swatch:n,v swatches:ns gauge:n gauges:ns cable:n cables:ns rib:n,v ribs:ns garter:n lace:n laces:ns
  cowl:n cowls:ns shawl:n shawls:ns sock:n socks:ns mitten:n mittens:ns scarf:n sleeve:n sleeves:ns button:n
  buttons:ns buttoned:vn pattern:n patterns:ns knot:n,v knots:ns needle:n,v needles:ns tassel:n fringe:n bobbin:n
  bobbins:ns spindle:n reel:n,v bobble:n bobbles:ns pleat:n,v pleats:ns   cuff:n cast:n,v,vn warm:j snug:j cosy:j
  patch:n,v mend:v cardigan:n `

/** A trade word that may be set into an idiom. */
export interface TradeWord {
  word: string
  roles: readonly Role[]
  /** offered only where the yarn holds this fibre; null in any yarn */
  fiber: string | null
}

/** The trade's words for wordplay. */
export const TRADE_PLAY: readonly TradeWord[] = TRADE.trim()
  .split(/\s+/)
  .map((entry) => {
    const [spelled, fiber] = entry.split('@')
    const [word, roles] = spelled!.split(':')
    return { word: word!, roles: roles!.split(',') as Role[], fiber: fiber ?? null }
  })

/**
 * Words that are said in two ways and mean two things: a reader cannot hear a pun that hangs on one
 * of them, so none is ever set into an idiom.
 */
export const HETERONYMS: ReadonlySet<string> = new Set(
  (
    'lead wind wound bow row sow tear live close dove bass refuse object desert minute present use sewer ' +
    'number does polish console entrance invalid moped produce project resume second intimate'
  ).split(' '),
)

/** How words that are said in two ways are said in their part of an idiom. */
export const SAID_AS: Readonly<Record<string, string>> = {
  'live:v': 'L IH1 V',
  'use:n': 'Y UW1 S',
  'close:j': 'K L OW1 S',
  'close:r': 'K L OW1 S',
  'close:v': 'K L OW1 Z',
  'lead:v': 'L IY1 D',
  'read:v': 'R IY1 D',
  'read:vn': 'R EH1 D',
  'tear:n': 'T EH1 R',
  'tears:ns': 'T IH1 R Z',
  'row:n': 'R OW1',
  'minute:n': 'M IH1 N AH0 T',
  'present:n': 'P R EH1 Z AH0 N T',
  'will:n': 'W IH1 L',
  'deserts:ns': 'D IH0 Z ER1 T S',
}
