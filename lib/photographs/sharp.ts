import sharp from 'sharp'

// What people upload meets only the loaders of the formats taken: no SVG, PDF or ImageMagick.
sharp.block({ operation: ['VipsForeignLoad'] })
sharp.unblock({
  operation: [
    'VipsForeignLoadJpeg',
    'VipsForeignLoadPng',
    'VipsForeignLoadWebp',
    'VipsForeignLoadHeif',
    'VipsForeignLoadTiff',
    'VipsForeignLoadNsgif',
  ],
})
// Each photograph is opened once or twice and never again.
sharp.cache(false)

/** sharp with every loader blocked but those of the formats taken, for the whole process. */
export default sharp
