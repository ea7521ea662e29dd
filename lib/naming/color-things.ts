import { hexToLab } from '../color/srgb'
import type { Lab } from '../color/types'

/** What kind of thing it is: plain names are put together of some, and not of others. */
export type ThingKind =
  | 'plant'
  | 'fruit'
  | 'food'
  | 'drink'
  | 'mineral'
  | 'metal'
  | 'weather'
  | 'water'
  | 'land'
  | 'animal'
  | 'fire'
  | 'dye'
  | 'color'
  | 'house'

/** A thing that has a colour people agree on. */
export interface ColorThing {
  word: string
  kind: ThingKind
  /** D65, 2° */
  lab: Lab
  /**
   * how it stands in a sentence: counted (one plum, two plums), not counted (thyme), the colour itself, or
   * only before a noun (rusty)
   */
  grammar: 'counted' | 'uncounted' | 'color' | 'adjective'
}

/**
 * Things with a colour, and the colour each is commonly thought of in; gathered and judged by eye
 * here. `+` is counted `*` a colour word that stands before a noun. No animals that are known for
 * their fur, and no fibres: such a name says what the yarn is made of (16 CFR 303.9, 303.18).
 */
const THINGS: Record<ThingKind, string> = {
  plant: `
    thyme 6f7d5a, sage 9ba58a, olive+ 6e6b2f, mint 9fd8b4, basil 3f6b35, dill 7c9650, chive+ 5f8a4a,
    parsley 4a7a37, rosemary 5d7060, lavender a393c4, lilac+ c0a2cc, violet+ 6f4a9c, heather+ 9a6f97,
    rose+ c9566e, lily+ f4eee0, poppy+ d43a26, daisy+ f6f1de, clover+ 7fa15a, thistle+ 8f6a9f,
    teasel+ a08a6c, gorse e8b92a, broom e6c22f, furze dcae2c, fern+ 4f7f3f, bracken 9c5a2d,
    moss 6f7f36, lichen a9b18f, ivy 35573a, holly 2c5a38, hazel 8b6740, birch d9d2c2, beech a9663b,
    ash b3b3ac, oak+ 8a6a42, elm+ 6d7c45, pine+ 2f5d46, fir+ 2b5543, yew+ 2a4a36, cedar+ 8e4f35,
    willow+ 93a36b, rowan+ c8442c, larch c79a45, alder 6d5a45, bark 6a4f3b, leaf 5f8a3c,
    reed+ a99a62, rush c2b280, sedge 8c8f4e, hay d3b869, straw e0ca82, wheat e0c07f, barley d2ad68,
    rye a98a56, corn edc64e, maize e9bd3c, grass 5f9138, grain d0ac6c, sheaf d6b464, bran b98a58,
    tansy e3b81f, yarrow eee3b8, sorrel 9a4a2f, mallow c98abf, lupin+ 6f63b3, aster+ 8f79b8,
    iris 5f53a6, tulip+ d0413c, fuchsia+ b8327c, bluebell+ 5a68b8, harebell+ 8a97d2,
    foxglove+ b1568f, primrose+ efe28d, cowslip+ e9cf4a, buttercup+ f2cc1e, marigold+ eb9a1d,
    dandelion+ efc21c, petal+ e6b3c0, bud+ b8c27a, thorn+ 6e4f41, briar+ b8586a, bramble+ 4b2a46,
    thrift d98aa8, campion+ d8658f, peony+ c8476f, wisteria a58fce, hop+ a3b457, nettle+ 4f7442,
    vine+ 5f7a3a, turf 5a6b36, heath 8a6b7d, 
    samphire 5f8a55, kelp 4f5128, laurel+ 3f6146, bay+ 5d6b45, catkin+ c8bb73, pollen e8b83a,
    acorn+ a5783f, conker+ 6b2f1c,
    cress 7fa85a, chard 4f6f3a, rocket 6f8f4a, fennel c9d49a, cumin b58a4a, bloom+ e39aa8, flower+ d98aa8,
    flower+ b58fd0, flower+ efcf4a, posy+ d97f98, sprig+ 7a9a5a, thicket+ 55653f, copse+ 4f6f45, frond+ 5f8f45,
    stem+ 7f9a50, root+ 7a5638, twig+ 7d6a54, seed+ b59a68, pod+ 86a84f, sprout+ 8fae5a, husk+ c8ab74, cork c79a68,
    maple+ b5512a, teak a0703f, nut+ 8a5f3a, petal+ f0cdd2, rose+ e8a5ad, rose+ a83a4f`,
  fruit: `
    plum+ 5f2f57, sloe+ 2e3050, damson+ 3f2346, fig+ 56344d, date+ 6a3f26, prune+ 3d2230,
    raisin+ 4a2a33, currant+ 6a1f2f, berry+ 7a2348, cherry+ a01b32, grape+ 5d3a6e, peach+ f4b58f,
    apricot+ f0a264, pear+ c9cc72, quince+ e3cb52, lemon+ f3de4c, lime+ a9cf45, citron+ e2d94e,
    orange+ ee8b2a, melon+ f5b183, apple+ a8c04d, medlar+ 7d5236, olive+ 6e6b2f, mulberry+ 5a2546,
    elder 3a2738, bilberry+ 33345a, raspberry+ b32a55, strawberry+ d43c48, gooseberry+ b1bd62,
    cranberry+ a1213f, blackberry+ 33213c, blueberry+ 4a5684, hip+ c23b25, haw+ a32a2c,
    greengage+ b5ba58, pomegranate+ a82e3f, tangerine+ f28528, satsuma+ f08a24, damask+ b5475f,
    walnut+ 6a4c35, almond+ dcb78a, pecan+ 8a5533, chestnut+ 7a4029,
    zest f0d84a, zest ee9a3a, rind+ d8c95a, berry+ 3f4a86, berry+ a5243f, peel ee9a3a`,
  food: `
    beet+ 7d1f42, kale 4f6b4a, leek+ b4c88a, pea+ 8fb04a, bean+ 6b8a43, turnip+ d9c3d3, carrot+ e8792b,
    chilli+ bf2a1f, pepper+ 3f3a36, nutmeg 9a6a44, clove+ 5a3a2c, ginger c88a4a,
    cinnamon a5673a, saffron edad24, mustard c99a1e, caper+ 6b7440, honey dd9f2e, butter f3dd86,
    cream f4ead0, milk f8f4ea, whey f1ead2, curd+ f0dc82, cheese eec253, custard f3dc8a, fudge+ b58557,
    toffee+ 9c5f2c, caramel+ b9742e, treacle 3d2318, cocoa 5f3d2b, biscuit+ d3a566, crumb+ cfa771,
    crust+ ad7541, scone+ e3bd83, bun+ c98d4b, dough e9d6b0, toast b9793c, loaf b57d43, oat+ d9c39a,
    porridge d3c2a2, salt f2f1ec, sugar f5f1e6, jam 9a1f38, marmalade dd7a1f, 
    pie+ cf9a55, egg+ eadcc3, yolk+ f0ac26, parkin 6d4226, plaice a68a62, 
    trout a59a7c, sole+ a99478, mussel+ 2f3650, shrimp eaa78c, salmon f09a80, oyster+ cfc8ba,
    prawn+ ea8f70, spice+ a4552b, sesame dcc394, lentil+ c8743a,
    swede+ d9a878, squash+ e0a04a, gourd+ d98f3a, marrow+ 6f8a4f, clam+ cfc2ad, kipper+ a8743a, carp c98a4a,
    cod c9bfa8, syrup a8642a, gravy 7a4f2f`,
  drink: `
    tea a5612a, ale+ b9772c, stout 2e201b, cider c98f34, mead d8a43c, rum 7a4424, wine 6b1f35,
    claret 741f35, port 4f1a2b, sherry b5743a, cordial 9c2a4a, mocha 6b4a39, chai b98a5f,
    malt a87843`,
  mineral: `
    slate+ 56606a, flint+ 6b6d6f, chalk f3f1e8, clay b57a58, loam 5f4732, peat 3a2a22, stone+ a8a296,
    pebble+ a09a90, sand d9c59a, dune+ d5bf8c, mud 6f5a45, rust a8502a, soot 2c2b2d, coal+ 2a2a2e,
    cinder+ 55504e, jet 1f2024, ink+ 24304f, jade 4f9a78, ruby+ a51c3f, opal+ d5e0dc,
    pearl+ ece6da, coral+ ee7f66, amber dd922a, garnet+ 7a1f2d, topaz dca34a, emerald+ 1f8a5a,
    agate a9796a, onyx 26262b, beryl 7fc0a6, quartz e6dcd8, shale 5f6266, marl 9c947c, ochre+ c68a35,
    umber+ 69502f, sienna b0602f, sepia 6a4a33, brick+ a44a38, salt f2f1ec, 
    shell+ ecd9c6, bone+ e8dfcb, cobble+ 8b8880, marble+ e3e0dc, slate+ 5a6f85, ink+ 1f3560,
    granite 8b8886, grit 8a8780, gravel 9a9488, boulder+ 86837c, silt a89a80, lava c8442a, tile+ b5623f,
    pumice b5b0a8`,
  metal: `
    copper b5683c, brass bf9a45, bronze 9a6a35, gold d6a92f, silver c2c5c8, steel 7f8a94, tin a9adb0,
    iron 5a5c60, zinc 9aa1a6, pewter 8b8f92, verdigris 5aa092, nickel a8a79c, penny 9a5a35, steel 5f7f9a`,
  weather: `
    sky+ 86b5dd, cloud+ cfd5da, rain 8b9ba8, mist+ c5cccb, fog b9bdbd, dew d7e6dc, frost dfe9ee,
    snow f6f8f9, sleet b8c4cb, hail d9e2e6, ice cfe6ee, storm+ 56626f, thunder 4f5566, 
    dusk 6f6386, dawn e9b8a8, night+ 23294a, moon+ e8e4d3, star+ f0ead0, sun+ f2bd3a, 
    drizzle b0b8bb, haze cfcad0, noon f0d57a ,
    sky+ 5f97cf, rain 6f8aa0, night+ 2f3a6a, storm+ 4a5f7a, ice a9cbdc`,
  water: `
    sea+ 3f7f94, wave+ 5f9fb0, tide+ 4a8296, shore+ cdb98f, cove+ 4f93a0, surf d9e8e8, brine 6f9c95,
    tarn+ 3a5a62, pond+ 5d7a66, brook+ 7fa5a5, beck+ 7f9ea0, creek+ 6f9590, lake+ 4a7fa5,
    river+ 5f8a94, foam e8efec, lagoon+ 3fa5a5, quay+ 8b8f90 ,
    sea+ 2a5f80, wave+ 3f7fb0, tide+ 3f6f9a, lake+ 3a6a9a`,
  land: `
    moor+ 7f6078, fell+ 6f7a56, field+ 8a9f4f, meadow+ 7fa548, hill+ 7a9060, dale+ 86a35f, glen+ 5f7f4f,
    wood+ 6a5a3f, marsh 7d8455, fen+ 7a8258, bog+ 4f4433, hedge+ 55703f, orchard+ 7f9a4a,
    beach dcc79c, cliff+ b3a893,
    vale+ 7f9f5f, grove+ 4f7a4a, ridge+ 7f7a6a, peak+ a5adb8, tor+ 7f7d78, loch+ 4f6f85, wold+ a8a76a,
    isle+ 5f8f7a, reef+ 3f9f98, mire+ 5a5238, crag+ 77767a`,
  animal: `
    tern+ d9dcdd, gull+ d4d6d5, swan+ f5f3ec, heron+ 8f9aa5, wren+ 8f6a48, robin+ c8582f, finch c9a44a,
    rook+ 2b2c38, raven+ 1f2230, crow+ 25262c, owl+ a58a66, lark+ ae946b, thrush b09872, plover+ b79a5e,
    jay+ 5f86b8, kingfisher+ 1f7f9f, duck+ 5f7d6a, teal 1f7a80, drake+ 2f6a52, goose b5ada2,
    peacock+ 0f6f86, deer a5754a, hart+ 8f5f3a, doe+ b08256, roe a9764a, fawn+ c9a57b, bee+ d69a24, 
    newt+ 6f7a3f, toad+ 6b6a42, frog+ 6f9a3f, eel+ 4a4f45, whelk+ c9b79a, cockle+ d9c8ae, crab+ c8643f,
    pike 7a7f52, roan 9a6458, dun b09a76,
    moth+ a89a88, kite+ a5562f, hen+ b5763f, hawk+ 8a6a4a, snail+ 9a8468`,
  fire: `
    ember+ c8452a, flame+ ec6a24, fire+ e2552a, smoke 8f9193, spark+ f2a53a, candle+ f3e3b5, glow f3b06a,
    blaze+ e8602a,
    hearth+ a8502f, kiln+ b0583a`,
  dye: `
    woad 43648f, madder b5382f, weld e0c83a, indigo 2f3a78, cochineal b02048, henna 9a4a2a, logwood 4a3560,
    annatto e5772a, walnut+ 6a4c35`,
  color: `
    red* c8242c, orange* ee8b2a, yellow* f0d02f, green* 3f8a45, blue* 2f62a8, purple* 6f3a8c, pink* ec93b0,
    brown* 75502f, black* 1f1f21, white* f7f6f2, grey* 8f9193, navy* 22305a, mauve* a57fa5, puce* a05a68,
    taupe* 8f8072, beige* dcc9a8, ecru* d8c8a2, greige* b8ac9c, tan* c9a06f, buff* dcb981, drab* 958a6b,
    khaki* a59a68, fawn* c9a57b, dun* b09a76, tawny* b8753a, russet* 9a4f2f, scarlet* cf2a22,
    crimson* a5182f, vermilion* dc4a2c, carmine* a8183f, magenta* b8267f, cerise* d12f6b, maroon* 6b1f2f,
    azure* 3f8fd9, cyan* 3fb5cf, aqua* 6fc9c5, turquoise* 2fb0a8, cobalt* 2450a0, cerulean* 3a8fc0,
    viridian* 2f7f68, celadon* a9c9a5, ivory* f1ead2, blush* e9b5ad, gold* d6a92f, silver* c2c5c8,
    sepia* 6a4a33, aubergine* 46253f, chartreuse* c2d23a, lilac* c0a2cc, teal* 1f7a80, periwinkle* 8a93d4,
    ultramarine* 2a3fa0, burgundy* 6a1a30, hazel* 8b6740, roan* 9a6458, rosy~ e3909a, bronze* 9a6a35,
    rusty~ a8502a, sandy~ d9c59a, golden~ dca83a, silvery~ c5c9cc, minty~ a8dcbb, peachy~ f3b893, smoky~ 8f9193,
    stormy~ 5a6672, sunny~ f2c94a, ruddy~ b5563f, ashen~ b3b3ac, mossy~ 6f7f36, milky~ f3efe4, inky~ 24304f,
    heathery~ 9a6f97, misty~ c5cccb, pearly~ ece6da, earthy~ 6a4f38, gilt* d0a640,
    blue* 6f9fd0, blue* 24407a, green* 7fae6a, green* 2a5a3a, grey* b5b8ba, grey* 5f6264, brown* 9a7350,
    brown* 4a3020, pink* d96a94, red* 9a1f2a, purple* 9a74b5, purple* 45245a, yellow* f3e08a, teal* 4a9aa0`,
  house: `
    kettle+ 4a4c50, lamp+ f0d9a0, brick+ a44a38, thatch b59a62, ribbon+ b8476a, quilt+ a58a9a,
    velvet 5a2a4a, candle+ f3e3b5, teapot+ 8f5a3a, slate+ 56606a, pebbledash b8ad98,
    whitewash f3f0e6, varnish a5662f, wax e6cf94, parchment e8d8b0, inkwell+ 24304f`,
}

const MARKS: Record<string, ColorThing['grammar']> = {
  '+': 'counted',
  '*': 'color',
  '~': 'adjective',
}

function readThings([kind, text]: [string, string]): ColorThing[] {
  return text
    .trim()
    .split(/,\s*/)
    .map((entry) => {
      const [marked, hex] = entry.trim().split(/\s+/)
      const mark = marked!.at(-1)!
      const word = marked!.replace(/[+*~]$/, '')
      return {
        word,
        kind: kind as ThingKind,
        lab: hexToLab(hex!),
        grammar: MARKS[mark] ?? 'uncounted',
      }
    })
}

/** Our things with a colour; a word may stand more than once, in each of its colours. */
export const COLOR_THINGS: readonly ColorThing[] = Object.entries(THINGS).flatMap(readThings)
