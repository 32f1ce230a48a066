/** The id of the one row that an insert has added. */
export async function insertedId(inserting: Promise<{ id: number }[]>): Promise<number> {
  const [row] = await inserting
  if (!row) throw new Error('insert returned no id')
  return row.id
}
