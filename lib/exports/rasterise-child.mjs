/**
 * The process in which drawings become pictures: one request a message, one answer each. It stands
 * apart since what people upload is decoded where SVG is refused, by the whole process.
 */
import sharp from 'sharp'

sharp.cache(false)
// The three pictures of a combination are made at once, each by one thread.
sharp.concurrency(1)

/** @type {Record<string, (request: any) => Promise<unknown>>} */
const WORK = {
  pictures: async (request) => {
    const { drawings, areas } = await prepare(request)
    const [pictures, shown] = await Promise.all([
      Promise.all(drawings.map(encode)),
      // For the files that carry their photograph within them.
      areas[0]?.jpeg({ quality: 86, chromaSubsampling: '4:4:4' }).toBuffer() ?? null,
    ])
    return { pictures, photograph: shown }
  },
  pixels: async (request) => {
    const { drawings } = await prepare(request)
    return Promise.all(drawings.map((drawing) => drawing.raw().toBuffer()))
  },
  encode: ({ pixels }) =>
    Promise.all(
      pixels.map(({ data, width, height }) =>
        encode(sharp(data, { raw: { width, height, channels: 3 } })),
      ),
    ),
}

/** The drawings with the photograph laid where each has a place for it. */
async function prepare({ photograph, drawings }) {
  const decoded =
    photograph &&
    (await sharp(photograph).removeAlpha().raw().toBuffer({ resolveWithObject: true }))
  const made = await Promise.all(
    drawings.map(async ({ svg, area }) => {
      // At 72 per inch a drawing's unit is a pixel.
      const drawing = sharp(Buffer.from(svg), { density: 72 }).removeAlpha()
      if (!decoded || !area) return { drawing }
      const { width, height } = area
      const { data: input, info } = await sharp(decoded.data, { raw: decoded.info })
        .resize(width, height, { fit: 'cover', position: 'attention' })
        .raw()
        .toBuffer({ resolveWithObject: true })
      const raw = { width, height, channels: info.channels }
      drawing.composite([{ input, raw, left: area.x, top: area.y }])
      return { drawing, cropped: sharp(input, { raw }) }
    }),
  )
  return {
    drawings: made.map(({ drawing }) => drawing),
    areas: made.flatMap(({ cropped }) => cropped ?? []),
  }
}

const encode = (picture) => picture.png({ compressionLevel: 6, adaptiveFiltering: true }).toBuffer()

process.on('message', async ({ id, work, ...request }) => {
  try {
    process.send({ id, result: await WORK[work](request) })
  } catch (error) {
    process.send({ id, error: String(error?.message ?? error) })
  }
})
// Whoever asked is gone: there is nobody to draw for.
process.on('disconnect', () => process.exit())
