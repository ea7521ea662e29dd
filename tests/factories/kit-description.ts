import sharp from 'sharp'

import { screenColor } from '@/lib/color/gamut'
import type { Lab } from '@/lib/color/types'
import type {
  ExportCombination,
  ExportDescription,
  ExportPhotograph,
  ExportShade,
} from '@/lib/exports/description'

const LABS: Lab[] = [
  [78, 3, 16],
  [54, 18, 46],
  [41, -17, 24],
  [33, 2, -28],
  [24, 8, 6],
]

/** Five shades of a combination as a kit is told of them. */
export const exportShades = (labs: readonly Lab[] = LABS): ExportShade[] =>
  labs.map((lab, index) => ({
    label: `No. ${index + 1}`,
    number: String(index + 1),
    lab,
    illuminant: 'D65',
    observer: 10,
    hex: screenColor(lab).hex,
    share: [0.31, 0.24, 0.19, 0.16, 0.1][index] ?? 0.2,
    role: ['MC', 'CC1', 'CC2', 'CC3', 'CC4'][index] ?? 'MC',
  }))

/** A photograph as a kit is told of it: plain sky over plain ground. */
export const exportPhotograph = async (
  values: Partial<ExportPhotograph> = {},
): Promise<ExportPhotograph> => ({
  title: 'Low sun',
  credit: 'Ines Thornbeck',
  licence: 'Own work',
  licenceUrl: '',
  sourceUrl: '',
  alt: 'Bracken above a small dark lake',
  bytes: await sharp({
    create: { width: 1200, height: 800, channels: 3, background: '#8899aa' },
  })
    .webp()
    .toBuffer(),
  ...values,
})

/** A combination as a kit is told of it. */
export const exportCombination = (values: Partial<ExportCombination> = {}): ExportCombination => ({
  id: 'a1',
  title: 'Low Sun, High Bracken',
  story: '',
  shades: exportShades(),
  photograph: null,
  ...values,
})

/** What a kit is made of. */
export const exportDescription = (...combinations: ExportCombination[]): ExportDescription => ({
  brand: 'Teasel & Tarn',
  line: 'Heronsway DK',
  combinations,
  asOf: new Date('2026-11-20T09:30:00Z'),
})

/** What somebody might write who means harm, or does not. */
export const HOSTILE = [
  '<script>alert(1)</script>',
  '"><img src=x onerror=alert(1)>',
  '=HYPERLINK("http://example.org","x")',
  '@SUM(1)\u0000',
  '\tmoss',
  '*/ } body { display: none } /*',
  '{moss.$value}',
  '$type',
  'שלום עולם',
  '🧶🧶',
  '-',
  '1st',
  '1st',
]

/** A description with hostile words in every place that people write in. */
export async function hostileDescription(): Promise<ExportDescription> {
  const combinations = await Promise.all(
    HOSTILE.map(async (words, index) =>
      exportCombination({
        id: `a${index}`,
        title: words,
        story: `${words}\n\n${words}`,
        shades: exportShades().map((shade) => ({ ...shade, label: words, number: words })),
        photograph: await exportPhotograph({
          title: words,
          credit: words,
          alt: words,
          licenceUrl: index % 2 ? 'https://example.org/?a=1&b="2"' : 'javascript:alert(1)',
        }),
      }),
    ),
  )
  return { ...exportDescription(...combinations), brand: HOSTILE[0]!, line: HOSTILE[1]! }
}
