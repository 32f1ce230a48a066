/** The demo people as a small table; imported late, because the seed opens the database. */
export async function describeSignIns(): Promise<string> {
  const { demoSignIns } = await import('../db/seed')
  const widest = Math.max(...demoSignIns.map(({ role }) => role.length))
  const lines = demoSignIns.map(
    ({ role, email, password }) => `  ${role.padEnd(widest)}  ${email}  ${password}`,
  )
  return `Demo sign-ins:\n${lines.join('\n')}\n`
}
