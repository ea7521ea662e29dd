import type { DemoIdea, DemoNaming } from './types'

/** Who brought a name that was approved, and the thought behind it; the others say nothing. */
export const demoThoughts: Record<string, Pick<DemoIdea, 'by' | 'note'>> = {
  '14': { by: 'designer', note: 'The wall behind the dye shed, any day from October.' },
  '21': { by: 'owner', note: 'Weld comes first in the vat book, so it begins the yellows.' },
  '33': { by: 'designer' },
  '34': { by: 'designer', note: 'He does, every evening, and never shuts the gate.' },
  '44': { by: 'marketer', note: 'Rose hips and haws. Three cheers for the hedge.' },
  '53': { by: 'owner', note: 'For the thistle by the door, who is somebody’s relation.' },
  '64': { by: 'marketer', note: 'Seen on the road to the lower farm, nearly.' },
  '66': { by: 'designer', note: 'The darker woad, half way through the bath.' },
  '73': { by: 'marketer', note: 'Said aloud when the boat let the water in.' },
  '84': { by: 'designer', note: 'It means well.' },
}

/** Ideas for Heronsway DK that are no names yet, in every state, and the heap. */
const ideas: DemoIdea[] = [
  {
    shade: '17',
    text: 'Mole’s Waistcoat',
    note: 'Brown velvet, a little short in front.',
    by: 'marketer',
    state: 'in-review',
    votes: [{ by: 'designer', vote: 'yes', comment: 'I can see the buttons.' }],
  },
  {
    shade: '45',
    text: 'Foxglove Compartment',
    note: 'Where one keeps the spare skein in a car.',
    by: 'marketer',
    state: 'in-review',
    votes: [
      { by: 'designer', vote: 'yes' },
      { by: 'owner', vote: 'unsure', comment: 'Do people abroad call it a glove compartment?' },
    ],
    talk: [
      { by: 'owner', text: 'Is it a fox or a glove that one thinks of? I hope neither of fur.' },
      { by: 'marketer', text: 'Of the flower, with this pink. I asked four people at the market.' },
    ],
  },
  {
    shade: '51',
    text: 'Cold Hands, Lilac Gloves',
    note: 'First frost, last lilac.',
    by: 'designer',
    state: 'in-review',
    votes: [{ by: 'owner', vote: 'yes', comment: 'Long, but it fits on two lines.' }],
  },
  {
    shade: '51',
    text: 'A Lilac of Concentration',
    note: 'What happens after row forty.',
    by: 'marketer',
    state: 'in-review',
    votes: [{ by: 'designer', vote: 'no', comment: 'It blames the knitter.' }],
  },
  {
    shade: '62',
    text: 'Bright Spells Promised',
    note: 'The forecast, believed for once.',
    by: 'marketer',
    state: 'in-review',
  },
  {
    shade: '65',
    text: 'Bluebell at Both Ends',
    note: 'One burns the candle for that colour.',
    by: 'marketer',
    state: 'in-review',
    votes: [
      { by: 'designer', vote: 'yes', comment: 'My favourite of the heap.' },
      { by: 'owner', vote: 'yes' },
    ],
  },
  {
    shade: '83',
    text: 'Moss Likely',
    note: 'North side of everything.',
    by: 'marketer',
    state: 'in-review',
    talk: [
      { by: 'designer', text: 'Next to Fern Intentions on the card: are two jokes too many?' },
    ],
  },
  {
    shade: '41',
    text: 'Lamb’s Inner Ear',
    note: 'The softest pink there is, and it listens.',
    by: 'designer',
    state: 'draft',
  },
  {
    shade: '63',
    text: 'Weather for Herons',
    note: 'The grey blue of standing still.',
    by: 'designer',
    state: 'draft',
  },
  {
    shade: '82',
    text: 'Lichen Your Chances',
    note: 'One likes them, on that wall.',
    by: 'marketer',
    state: 'draft',
  },
  {
    shade: '82',
    text: 'Crazy Paving',
    note: 'Lichen between the flagstones.',
    by: 'marketer',
    state: 'draft',
    wordingReason: 'It is what everybody calls that kind of path.',
  },
  {
    shade: '52',
    text: 'Outbreaks of Heather',
    note: 'Moving in from the west.',
    by: 'marketer',
    state: 'returned',
    reason: 'We have two forecasts already with Drizzle at Ten. Another picture, please.',
    votes: [{ by: 'designer', vote: 'no', comment: 'It sounds like a rash.' }],
  },
  {
    shade: '71',
    text: 'Egg, Unattended',
    note: 'The duck had gone for a walk.',
    by: 'designer',
    state: 'returned',
    reason: 'On a label the comma gets lost. Is there a way to say it without?',
  },
  {
    shade: '61',
    text: 'Skim Milk at Daybreak',
    note: 'Blue in the jug, white in the cup.',
    by: 'marketer',
    state: 'put-by',
  },
  {
    shade: '54',
    text: 'Elderberry Wiser',
    note: 'Very wise, spread over three syllables.',
    by: 'marketer',
    state: 'put-by',
  },
  ...heap('marketer', [
    ['Mist Opportunity', 'From the notebook, in the rain.'],
    ['A Pear of the Realm', 'Green, and rather grand.'],
    ['Practise What You Peach', ''],
    ['Apricot Before the Horse', 'Say it quickly.'],
    ['Ice Try', ''],
    ['Dawn and Dusted', 'The sky at six, with flour.'],
    ['Teal Me About It', ''],
    ['Sage Before Beauty', ''],
    ['Beet Around the Bush', 'A follower sent this one on a postcard.'],
    ['Sloe Going', ''],
    ['Rust Between Friends', ''],
    ['Mint to Be', ''],
    ['Moss Unlikely', 'For a shade with no moss in it.'],
    ['Cashmere Reserves', 'For the bank holiday post.'],
    ['Whoever Left the Gate Open', 'From the team call. We all know who.'],
    ['Second Cup', 'From the team call.'],
    [
      'What the Heron Said to the Other Heron by the Weir',
      'Too long, I know. But what did it say?',
    ],
  ]),
  ...heap('designer', [
    ['Barley Awake', 'Before the first tea.'],
    ['Lime and Again', ''],
    ['Frost Come, Frost Served', ''],
    ['Wheat Nothings', ''],
    ['Plum in the Middle', ''],
    ['Ask Me After Lambing', 'What Edda says to everything in March.'],
    ['Sky and Mighty', 'For a blue that looks down on one.'],
  ]),
  ...heap('owner', [
    ['Honeysuckle Your Way Out', ''],
    ['Nan’s Good Cardigan', 'Whichever colour it was, nobody agrees.'],
  ]),
  {
    shade: null,
    text: 'Wool I Never',
    note: '',
    by: 'marketer',
    state: 'put-by',
  },
  {
    shade: null,
    text: 'Ewe Had to Be There',
    note: 'For another line, perhaps.',
    by: 'designer',
    state: 'put-by',
  },
]

function heap(by: DemoIdea['by'], texts: [text: string, note: string][]): DemoIdea[] {
  return texts.map(([text, note]) => ({ shade: null, text, note, by, state: 'draft' }))
}

/** What is set and thought of for the names of a line, by its slug. */
export const demoNaming: Record<string, DemoNaming> = {
  'heronsway-dk': {
    care: 'Hand wash cool. Dry flat, out of the sun.',
    themes: ['tarn', 'fell', 'hedgerow', 'weather', 'kettle'],
    reviewer: 'designer',
    ideas,
  },
}
