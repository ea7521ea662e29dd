import { fileURLToPath } from 'node:url'

import { sequelize } from '@/models'

import { seedDemo } from './seed-demo'

if (process.argv[1] === fileURLToPath(import.meta.url)) {
  try {
    console.log(await seedDemo())
  } finally {
    await sequelize().close()
  }
}
