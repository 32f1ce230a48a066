import { migrateDatabase } from '../db/migrate'
import { openDatabase } from './openDatabase'

const database = await openDatabase(console.log)
try {
  await migrateDatabase(database.url)
  console.log('The tables are up to date.')
} finally {
  await database.close()
}
