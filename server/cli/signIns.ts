/** The demo people as a small table; imported late, because the seed opens the database. */
export async function describeSignIns(): Promise<string> {
  const { demoSignIns } = await import('../db/seed')
  const widest = Math.max(...demoSignIns.map(({ email }) => email.length))
  const lines = demoSignIns.map(
    ({ who, email, passphrase }) => `  ${email.padEnd(widest)}  ${passphrase}  (${who})`,
  )
  return `Demo sign-ins (e-mail, passphrase):\n${lines.join('\n')}\n`
}
