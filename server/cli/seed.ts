import { openDatabase } from './openDatabase'

const database = await openDatabase(console.log)
process.env['DATABASE_URL'] = database.url
const { db, pool } = await import('../db/client')
const { isEmpty, reseedDatabase, seedDatabase } = await import('../db/seed')

/** Empties nothing by accident: a filled database is only touched when asked to, and never in production. */
async function seed(isAgain: boolean): Promise<void> {
  if (isAgain && process.env['NODE_ENV'] === 'production') {
    throw new Error('The demo is not seeded anew in production. Set NODE_ENV to something else.')
  }
  if (isAgain) {
    await reseedDatabase(db)
    console.log('The demo courses and people are as new; what others have made beside them stays.')
    return
  }
  if (!(await isEmpty(db))) {
    console.log(
      'The database is not empty: nothing was changed. “npm run seed -- --again” renews the demo.',
    )
    return
  }
  await seedDatabase(db)
  console.log('The demo courses and people are in.')
}

try {
  await seed(process.argv.includes('--again'))
} catch (error) {
  console.error(error instanceof Error ? error.message : error)
  process.exitCode = 1
} finally {
  await pool.end()
  await database.close()
}
