import * as mariadb from 'mariadb'

/** Ask a database directly, past the app. One connection a question: the server may have been killed since the last. */
export async function rows<Row>(url: string, sql: string, values: unknown[] = []): Promise<Row[]> {
  const connection = await mariadb.createConnection(url)
  try {
    return await connection.query<Row[]>(sql, values)
  } finally {
    await connection.end()
  }
}
