import { Client } from 'pg';

export type Row = Readonly<Record<string, unknown>>;

/** One connection of the plain driver, as the API's role: what the floors are made of. */
export class Plain {
  readonly #client: Client;

  private constructor(client: Client) {
    this.#client = client;
  }

  static async connect(url: string): Promise<Plain> {
    const client = new Client({ connectionString: url });
    await client.connect();
    return new Plain(client);
  }

  /** One transaction that sees every row. */
  async inTransaction<T>(work: () => Promise<T>): Promise<T> {
    await this.#client.query(
      `begin; select set_config('seamwright.caller', 'system', true), set_config('seamwright.customers', '*', true),
        set_config('seamwright.sites', '*', true)`,
    );
    const result = await work();
    await this.#client.query('commit');
    return result;
  }

  async query(text: string, values: readonly unknown[] = []): Promise<Row[]> {
    return (await this.#client.query<Row>(text, [...values])).rows;
  }

  /** Adds rows as they are, in one statement. */
  async insert(table: string, rows: readonly Row[]): Promise<void> {
    const columns = Object.keys(rows[0] ?? {}).join(', ');
    await this.#client.query(
      `insert into ${table} (${columns}) select ${columns} from jsonb_populate_recordset(null::${table}, $1)`,
      [JSON.stringify(rows)],
    );
  }

  /** Rows as they can be added again, without the columns that the database fills. */
  async rowsToCopy(table: string, column: string, ids: readonly string[], filled: readonly string[]): Promise<Row[]> {
    const found = await this.inTransaction(() =>
      this.query(`select to_jsonb(t) - $2::text[] as row from ${table} t where ${column}::text = any ($1)`, [
        ids,
        filled,
      ]),
    );
    return found.map(({ row }) => row as Row);
  }

  close(): Promise<void> {
    return this.#client.end();
  }
}
