import type { Role } from './idioms'

/**
 * The trade's own words, which suit yarn of any colour: those of yarn, dye and stitch, which a knitter
 * knows at once for the pun. `word:roles`; a fibre after `@` means that the word is offered only where
 * the yarn holds it.
 */
const OF_YARN = `
  yarn:n yarns:ns skein:n skeins:ns hank:n hanks:ns ply:n,v plies:vz,ns plied:vd,vn plying:vg
  wool:n@wool wools:ns@wool woolly:j@wool woollen:j@wool worsted:n,j@wool silk:n@silk silky:j@silk
  silks:ns@silk linen:n@linen flax:n@linen cotton:n@cotton
  fleece:n fleeces:ns ewe:n ewes:ns lamb:n lambs:ns ram:n rams:ns flock:n,v flocks:ns baa:n,v sheep:n,ns
  sheepish:j tuft:n,j tufts:ns bleat:n,v bleating:vg bale:n bales:ns
  shear:n,v,j shears:ns,vz shorn:vn dye:n,v dyes:ns,vz dyed:vd,vn,j dyeing:vg,n dyer:n dyers:ns vat:n vats:ns
  hue:n hues:ns tint:n,v tints:ns,vz tinted:vd,vn,j tone:n,v tones:ns shade:n,v shades:ns,vz shady:j
  pigment:n pigments:ns palette:n paint:n,v paints:ns,vz
  knit:n,v,vd,vn knits:vz,ns knitted:vd,vn,j knitting:vg,n knitter:n knitters:ns purl:n,v purls:ns,vz
  purled:vd,vn stitch:n,v stitches:ns,vz stitched:vd,vn knot:n,v knots:ns,vz thread:n,v threads:ns,vz
  twine:n,v twines:vz,ns spin:n,v spins:vz spun:vd,vn spinning:vg spinner:n spinners:ns weave:n,v weaves:vz
  woven:vn,j wove:vd weaving:vg weaver:n weavers:ns loom:n,v looms:ns,vz weft:n needle:n,v needles:ns
  seam:n,v seams:ns,vz sew:v sews:vz sewn:vn`

/** The words of what is made of it, and of how: they suit as well, and are thought of less soon. */
const OF_MAKING = `
  hem:n,v hems:ns,vz darn:n,v darned:vn,j darning:vg strand:n,v strands:ns spool:n spools:ns warp:n,v
  felt:n,vd,vn tweed:n twill:n plaid:n quilt:n,v quilts:ns swatch:n,v swatches:ns gauge:n gauges:ns
  cable:n cables:ns rib:n,v ribs:ns garter:n lace:n laces:ns laced:vn cowl:n cowls:ns shawl:n shawls:ns
  sock:n socks:ns mitten:n mittens:ns mitt:n sleeve:n sleeves:ns button:n,v buttons:ns pattern:n patterns:ns
  glove:n gloves:ns vest:n vests:ns snood:n sweater:n sweaters:ns wrap:n,v wraps:ns,vz wrapped:vn tassel:n
  tassels:ns fringe:n bobbin:n bobbins:ns spindle:n reel:n,v reels:ns bobble:n,v pleat:n,v pleats:ns cuff:n
  cuffs:ns cast:v,vn patch:n,v patches:ns mend:v mends:vz crimp:n,v`

/** A trade word that may be set into an idiom. */
export interface TradeWord {
  word: string
  roles: readonly Role[]
  /** offered only where the yarn holds this fibre; null in any yarn */
  fiber: string | null
  /** 0–1: how soon one thinks of yarn, dye or knitting */
  near: number
}

const readTrade = (text: string, near: number): TradeWord[] =>
  text
    .trim()
    .split(/\s+/)
    .map((entry) => {
      const [spelled, fiber] = entry.split('@')
      const [word, roles] = spelled!.split(':')
      return { word: word!, roles: roles!.split(',') as Role[], fiber: fiber ?? null, near }
    })

/** The trade's words for wordplay. */
export const TRADE_PLAY: readonly TradeWord[] = [
  ...readTrade(OF_YARN, 1),
  ...readTrade(OF_MAKING, 0.75),
]

/** Things with a colour that are also done: a brook, and to brook. */
export const ALSO_VERBS: ReadonlySet<string> = new Set(
  (
    'glow brook sand mist cloud rain dawn bark wave crow hawk duck ink hail ice storm snow bloom flower ' +
    'root steel tan blush rust stem crust toast pepper salt butter cream jam spice sugar blaze smoke spark ' +
    'flame fire peak seed sprout surf moor'
  ).split(' '),
)

/** Things with a colour whose name means something else at once, or nothing that one would wear. */
export const NOT_PLAYED: ReadonlySet<string> = new Set(
  'haw hip bog thrush date stout drab goose rum peel rocket lamp'.split(' '),
)

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
