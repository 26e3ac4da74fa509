import { migrations } from '#migrations'
import { openDatabase } from '../db/client'

export default defineNitroPlugin((nitro) => {
  const opened = openDatabase(`${process.env.DATA_DIR || '.data'}/sillion.db`, migrations)
  nitro.hooks.hook('close', opened.close)
})
