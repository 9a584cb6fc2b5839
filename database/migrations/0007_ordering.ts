import { appendOnly, audited, customerRows, type Migration } from '../migration';

/**
 * What belongs to an order is seen by whoever sees the order: a buyer who is kept to some sites must not reach the lines
 * of another site. Callers who see all sites are spared the look at the order.
 */
const rowsOfOrder = (table: string): string => `
    alter table ${table} enable row level security;
    alter table ${table} force row level security;
    create policy by_order on ${table} using (
      (select caller_sees_all())
      or (
        customer_id = any ((select caller_customers())::uuid[])
        and (
          (select caller_sees_all_sites())
          or exists (select from orders o where o.customer_id = ${table}.customer_id and o.id = ${table}.order_id)
        )
      )
    );`;

/** The calendar of delivery days, orders with their lines, every change of them, and orders loaded from a spreadsheet. */
export const ordering: Migration = {
  name: '0007_ordering',
  sql: `
    create table delivery_zones (
      id uuid primary key,
      row_version integer not null default 1,
      name text not null constraint delivery_zones_name unique,
      weekdays integer[] not null constraint delivery_zones_weekdays check (weekdays <@ '{1,2,3,4,5,6,7}'::integer[]),
      cut_off_time text not null constraint delivery_zones_cut_off check (cut_off_time ~ '^([01][0-9]|2[0-3]):[0-5][0-9]$'),
      lead_days integer not null constraint delivery_zones_lead check (lead_days between 1 and 14),
      delivery_charge_minor bigint not null constraint delivery_zones_charge check (delivery_charge_minor >= 0)
    );
    create table plant_closures (
      day date primary key,
      reason text not null
    );
    create table site_zones (
      site_id uuid primary key,
      customer_id uuid not null,
      row_version integer not null default 1,
      zone_id uuid not null references delivery_zones (id),
      constraint site_zones_site foreign key (customer_id, site_id) references sites (customer_id, id)
    );
    ${customerRows('site_zones', 'customer_id', 'site_id')}
    ${audited('delivery_zones')}
    ${audited('plant_closures', { key: 'day' })}
    ${audited('site_zones', { key: 'site_id' })}

    create sequence order_numbers start 1001;
    create table orders (
      id uuid primary key,
      row_version integer not null default 1,
      number bigint not null default nextval('order_numbers') constraint orders_number unique,
      customer_id uuid not null references customers (id),
      site_id uuid not null,
      delivery_day date not null,
      source text not null constraint orders_source check (source in ('storefront', 'desk', 'import')),
      settlement text not null constraint orders_settlement check (settlement in ('card', 'account')),
      -- What the order waits for before it counts as confirmed: any of payment, promise, credit.
      waiting_for text[] not null default '{}' constraint orders_waiting check (waiting_for <@ '{payment,promise,credit}'::text[]),
      currency text not null default 'GBP',
      customer_reference text,
      note text,
      delivery_charge_minor bigint not null,
      delivery_tax_ppm bigint not null,
      placed_at timestamptz not null,
      placed_by uuid references people (id),
      released_at timestamptz,
      packed_at timestamptz,
      cancelled_at timestamptz,
      cancelled_because text,
      constraint orders_of_customer unique (customer_id, id),
      constraint orders_site foreign key (customer_id, site_id) references sites (customer_id, id)
    );
    create index orders_of_day on orders (delivery_day, customer_id) where cancelled_at is null;
    create index orders_newest_of_customer on orders (customer_id, placed_at desc, id desc);
    create index orders_newest on orders (placed_at desc, id desc);
    ${customerRows('orders', 'customer_id', 'site_id')}
    ${audited('orders')}

    create table order_lines (
      id uuid primary key,
      order_id uuid not null,
      customer_id uuid not null,
      position integer not null,
      specification_id uuid not null references specifications (id),
      version_id uuid not null references specification_versions (id),
      choices jsonb not null,
      choice_key text not null,
      -- The choices in words, as they were agreed.
      choice_summary text not null,
      quantity_unit text not null constraint order_lines_unit check (quantity_unit in ('piece', 'case', 'kg')),
      quantity_count integer,
      quantity_grams bigint,
      not_less boolean not null default false,
      pieces integer not null constraint order_lines_pieces check (pieces > 0),
      min_grams bigint not null,
      estimate_grams bigint not null,
      max_grams bigint not null,
      basis text not null constraint order_lines_basis check (basis in ('kg', 'piece', 'case')),
      price_minor bigint not null constraint order_lines_price check (price_minor > 0),
      price_why jsonb not null,
      tax_ppm bigint not null constraint order_lines_tax check (tax_ppm >= 0),
      min_minor bigint not null,
      estimate_minor bigint not null,
      max_minor bigint not null,
      when_short text not null constraint order_lines_when_short check (when_short in ('leave-off', 'send-what-there-is', 'ask-me')),
      note text,
      short_pieces integer not null default 0 constraint order_lines_short check (short_pieces between 0 and pieces),
      short_reason text,
      constraint order_lines_of_customer unique (customer_id, id),
      constraint order_lines_position unique (order_id, position),
      constraint order_lines_order foreign key (customer_id, order_id) references orders (customer_id, id) on delete cascade,
      constraint order_lines_quantity check (
        (quantity_unit = 'kg' and quantity_grams > 0 and quantity_count is null)
        or (quantity_unit <> 'kg' and quantity_count > 0 and quantity_grams is null)
      ),
      constraint order_lines_weights check (0 < min_grams and min_grams <= estimate_grams and estimate_grams <= max_grams),
      constraint order_lines_amounts check (0 <= min_minor and min_minor <= estimate_minor and estimate_minor <= max_minor)
    );
    create index order_lines_order_id on order_lines (order_id);
    ${rowsOfOrder('order_lines')}
    ${audited('order_lines')}
    alter table packs add constraint packs_order_line foreign key (customer_id, order_line_id)
      references order_lines (customer_id, id);

    create table order_changes (
      id uuid primary key,
      order_id uuid not null,
      customer_id uuid not null,
      at timestamptz not null,
      person_id uuid references people (id),
      what text not null,
      detail jsonb not null default '{}',
      constraint order_changes_order foreign key (customer_id, order_id) references orders (customer_id, id)
    );
    create index order_changes_order_id on order_changes (order_id, at);
    ${rowsOfOrder('order_changes')}
    ${appendOnly('order_changes')}

    -- A workbook of orders: looked at first, then taken once.
    create table order_imports (
      id uuid primary key,
      row_version integer not null default 1,
      file_name text not null,
      file_hash text not null,
      read_rows jsonb not null,
      uploaded_by uuid not null references people (id),
      uploaded_at timestamptz not null,
      taken text constraint order_imports_taken check (taken in ('good-rows', 'all-or-none')),
      taken_at timestamptz,
      order_ids uuid[] not null default '{}'
    );
    alter table order_imports enable row level security;
    alter table order_imports force row level security;
    -- A workbook may name any customer: whoever is kept to some customers sees their own workbooks only.
    create policy staff_only on order_imports using (
      (select caller_sees_all()) or ((select caller_kind()) = 'staff' and uploaded_by = (select caller_person()))
    );
  `,
};
