import { readShades } from './read-shades'
import type { DemoBrand } from './types'

/** The two brands of the demo: one with a whole line, a small second one that must stay unseen by it. */
export const demoBrands: DemoBrand[] = [
  {
    slug: 'teasel-and-tarn',
    name: 'Teasel & Tarn',
    lines: [
      {
        slug: 'heronsway-dk',
        name: 'Heronsway DK',
        fibers: [
          { fiber: 'wool', percent: 70 },
          { fiber: 'silk', percent: 30 },
        ],
        ply: 3,
        yarnWeight: 3,
        grams: 100,
        meters: 225,
        needleMm: 4,
        gauge: { stitches: 22, rows: 30 },
        currency: 'GBP',
        priceMinor: 2150,
        launchDate: '2027-03-20',
        shades: readShades('heronsway-dk.csv'),
      },
    ],
  },
  {
    slug: 'quern-yarn-works',
    name: 'Quern Yarn Works',
    lines: [
      {
        slug: 'hopper-sock',
        name: 'Hopper Sock',
        fibers: [
          { fiber: 'wool', percent: 75 },
          { fiber: 'nylon', percent: 25 },
        ],
        ply: 4,
        yarnWeight: 1,
        grams: 100,
        meters: 400,
        needleMm: 2.5,
        gauge: { stitches: 30, rows: 42 },
        currency: 'GBP',
        priceMinor: 1850,
        launchDate: '2027-05-08',
        shades: readShades('hopper-sock.csv'),
      },
    ],
  },
]
