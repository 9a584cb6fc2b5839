import { audited, type Migration } from '../migration';

/** Lists that the caller may write in: staff of all customers any, others those of their own customers only. */
const ownList = `(
  (select caller_sees_all())
  or price_list_id in (select id from price_lists where customer_id = any ((select caller_customers())::uuid[]))
)`;

/** SQL for policies of reading and writing that differ: everybody reads the base list, few write in it. */
function readAndWritten(table: string, read: string, written: string): string {
  return `
    alter table ${table} enable row level security;
    alter table ${table} force row level security;
    create policy read_by on ${table} for select using (${read});
    create policy added_by on ${table} for insert with check (${written});
    create policy changed_by on ${table} for update using (${written});
    create policy removed_by on ${table} for delete using (${written});`;
}

/** Price lists by level, and quotes whose acceptance makes a customer's agreement. */
export const pricing: Migration = {
  name: '0005_pricing',
  sql: `
    create table price_lists (
      id uuid primary key,
      level text not null constraint price_lists_level check (level in ('base', 'group', 'customer', 'agreement')),
      group_id uuid references customer_groups (id),
      customer_id uuid references customers (id),
      name text not null,
      currency text not null default 'GBP',
      constraint price_lists_owner check (
        (level = 'base' and group_id is null and customer_id is null)
        or (level = 'group' and group_id is not null and customer_id is null)
        or (level in ('customer', 'agreement') and customer_id is not null and group_id is null)
      ),
      constraint price_lists_once unique nulls not distinct (level, group_id, customer_id),
      constraint price_lists_of_customer unique (id, customer_id)
    );
    ${readAndWritten(
      'price_lists',
      `(select caller_sees_all())
        or (level = 'base' and (select caller_kind()) in ('user', 'staff'))
        or customer_id = any ((select caller_customers())::uuid[])
        or group_id in (select group_id from customers)`,
      `(select caller_sees_all()) or customer_id = any ((select caller_customers())::uuid[])`,
    )}

    create table price_lines (
      id uuid primary key,
      row_version integer not null default 1,
      price_list_id uuid not null references price_lists (id),
      customer_id uuid references customers (id),
      specification_id uuid not null references specifications (id),
      choice_key text,
      basis text not null constraint price_lines_basis check (basis in ('kg', 'piece', 'case')),
      price_minor bigint not null constraint price_lines_price check (price_minor > 0),
      valid daterange not null constraint price_lines_valid check (not isempty(valid) and not lower_inf(valid)),
      quote_line_id uuid,
      constraint price_lines_list foreign key (price_list_id, customer_id) references price_lists (id, customer_id),
      constraint price_lines_no_overlap exclude using gist (
        price_list_id with =, specification_id with =, coalesce(choice_key, '') with =, valid with &&
      )
    );
    create index price_lines_lookup on price_lines (specification_id, price_list_id);
    ${readAndWritten('price_lines', 'exists (select from price_lists l where l.id = price_list_id)', ownList)}
    ${audited('price_lines')}

    create table price_breaks (
      price_line_id uuid not null references price_lines (id) on delete cascade,
      from_quantity bigint not null constraint price_breaks_quantity check (from_quantity > 1),
      price_minor bigint not null constraint price_breaks_price check (price_minor > 0),
      primary key (price_line_id, from_quantity)
    );
    ${readAndWritten(
      'price_breaks',
      'exists (select from price_lines l where l.id = price_line_id)',
      `price_line_id in (select id from price_lines where ${ownList})`,
    )}

    create sequence quote_numbers start 201;
    create table quotes (
      id uuid primary key,
      row_version integer not null default 1,
      number bigint not null default nextval('quote_numbers') constraint quotes_number unique,
      customer_id uuid not null references customers (id),
      state text not null constraint quotes_state
        check (state in ('draft', 'sent', 'accepted', 'declined', 'expired')),
      currency text not null default 'GBP',
      prices_from date not null,
      prices_until date not null,
      answer_by date not null,
      notes text not null default '',
      written_by uuid not null references people (id),
      -- As it stands on the paper: the customer can't look up our people.
      writer_name text not null,
      created_at timestamptz not null,
      sent_at timestamptz,
      decided_at timestamptz,
      decided_by uuid references people (id),
      constraint quotes_of_customer unique (customer_id, id),
      constraint quotes_dates check (prices_from <= prices_until)
    );
    create index quotes_of_customer_newest on quotes (customer_id, number desc);
    create index quotes_open on quotes (answer_by) where state = 'sent';
    alter table quotes enable row level security;
    alter table quotes force row level security;
    -- A draft is the desk's own until it is sent.
    create policy by_customer on quotes using (
      (select caller_sees_all())
      or (
        customer_id = any ((select caller_customers())::uuid[])
        and (state <> 'draft' or (select caller_kind()) = 'staff')
      )
    );
    ${audited('quotes')}

    create table quote_lines (
      id uuid primary key,
      quote_id uuid not null,
      customer_id uuid not null,
      position integer not null,
      specification_id uuid not null references specifications (id),
      version_id uuid not null references specification_versions (id),
      choices jsonb not null,
      choice_key text not null,
      basis text not null constraint quote_lines_basis check (basis in ('kg', 'piece', 'case')),
      price_minor bigint not null constraint quote_lines_price check (price_minor > 0),
      constraint quote_lines_quote foreign key (customer_id, quote_id) references quotes (customer_id, id) on delete cascade,
      constraint quote_lines_position unique (quote_id, position)
    );
    alter table quote_lines enable row level security;
    alter table quote_lines force row level security;
    create policy by_quote on quote_lines using (exists (select 1 from quotes where quotes.id = quote_id));
    alter table price_lines add constraint price_lines_quote_line foreign key (quote_line_id) references quote_lines (id);
  `,
};
