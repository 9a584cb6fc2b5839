/** One step of the schema: a name `NNNN_what`, and the SQL that makes it. Forward only once landed. */
export interface Migration {
  readonly name: string;
  readonly sql: string;
}

/**
 * SQL that puts a table with a customer's rows under row-level security, forced, so that a forgotten `where` leaks nothing.
 * `column` names the customer; a null there is seen by callers who see all customers only.
 */
export function customerRows(table: string, column = 'customer_id', site?: string): string {
  const bySite = site
    ? ` and ((select caller_sees_all_sites()) or ${site} = any ((select caller_sites())::uuid[]))`
    : '';
  return `
    alter table ${table} enable row level security;
    alter table ${table} force row level security;
    create policy by_customer on ${table} using (
      (select caller_sees_all()) or (${column} = any ((select caller_customers())::uuid[])${bySite})
    );`;
}

interface Audited {
  /** Names the row in the audit. */
  readonly key?: string;
  /** Columns that are never written down. */
  readonly secret?: readonly string[];
}

/** SQL that writes every change of a table to the audit. */
export function audited(table: string, { key = 'id', secret = [] }: Audited = {}): string {
  const args = [key, ...secret].map((column) => `'${column}'`).join(', ');
  return `
    create trigger ${table}_audit after insert or update or delete on ${table}
      for each row execute function write_audit(${args});`;
}

/** SQL that lets rows be added but never changed or removed. */
export function appendOnly(table: string): string {
  return `
    create trigger ${table}_append_only before update or delete on ${table}
      for each row execute function refuse_change();`;
}
