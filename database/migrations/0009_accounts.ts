import { appendOnly, audited, customerRows, type Migration } from '../migration';

/** Card payments, invoices, the ledger, and what the processor and the bank say. */
export const accounts: Migration = {
  name: '0009_accounts',
  sql: `
    create table processor_customers (
      customer_id uuid primary key references customers (id),
      processor_id text not null constraint processor_customers_processor unique
    );
    ${customerRows('processor_customers')}

    create table payment_cards (
      id uuid primary key,
      customer_id uuid not null references customers (id),
      -- What the browser was given for the card; once kept, the id under which the processor keeps it.
      processor_method_id text not null,
      state text not null constraint payment_cards_state check (state in ('adding', 'kept', 'refused', 'removing', 'removed')),
      brand text,
      last4 text,
      expires text,
      decline_code text,
      created_at timestamptz not null,
      updated_at timestamptz not null,
      constraint payment_cards_of_customer unique (customer_id, id),
      constraint payment_cards_known check (
        state not in ('kept', 'removing') or (brand is not null and last4 is not null and expires is not null)
      )
    );
    create index payment_cards_customer on payment_cards (customer_id, created_at) where state = 'kept';
    create index payment_cards_unsettled on payment_cards (updated_at) where state in ('adding', 'removing');
    ${customerRows('payment_cards')}

    -- Written before the processor is called, with the key that every repeat of the call uses.
    create table payments (
      id uuid primary key,
      row_version integer not null default 1,
      customer_id uuid not null,
      order_id uuid not null,
      processor_method_id text not null,
      currency text not null,
      hold_minor bigint not null constraint payments_hold check (hold_minor > 0),
      captured_minor bigint not null default 0 constraint payments_captured check (captured_minor between 0 and hold_minor),
      to_capture_minor bigint,
      state text not null constraint payments_state check (state in (
        'started', 'needs-action', 'pre-authorised', 'declined', 'capturing', 'captured', 'releasing', 'released', 'failed'
      )),
      processor_intent_id text constraint payments_intent unique,
      processor_charge_id text constraint payments_charge unique,
      hold_ends_at timestamptz,
      decline_code text,
      -- Where the holder confirms with the bank.
      action_url text,
      captured_at timestamptz,
      created_at timestamptz not null,
      updated_at timestamptz not null,
      constraint payments_of_customer unique (customer_id, id),
      constraint payments_order foreign key (customer_id, order_id) references orders (customer_id, id)
    );
    create index payments_order_id on payments (order_id);
    create index payments_newest on payments (created_at desc, id desc);
    create index payments_captured_at on payments (captured_at) where captured_at is not null;
    create index payments_unsettled on payments (updated_at)
      where state in ('started', 'needs-action', 'capturing', 'releasing');
    ${customerRows('payments')}
    ${audited('payments')}

    -- Numbers that may have no gap come from a row that is locked until the invoice is committed.
    create table counters (
      name text primary key,
      next bigint not null
    );
    insert into counters values ('invoice', 2001);

    create table invoices (
      id uuid primary key,
      number bigint not null constraint invoices_number unique,
      customer_id uuid not null,
      order_id uuid not null constraint invoices_once unique,
      delivery_day date not null,
      issued_on date not null,
      due_on date not null,
      currency text not null,
      net_minor bigint not null,
      tax_minor bigint not null,
      total_minor bigint not null,
      reference text not null constraint invoices_reference unique,
      document_id uuid references documents (id),
      created_at timestamptz not null,
      constraint invoices_of_customer unique (customer_id, id),
      constraint invoices_order foreign key (customer_id, order_id) references orders (customer_id, id),
      constraint invoices_total check (total_minor = net_minor + tax_minor)
    );
    create index invoices_newest on invoices (customer_id, number desc);
    create index invoices_document on invoices (document_id);
    ${customerRows('invoices')}
    ${appendOnly('invoices')}

    create table invoice_lines (
      id uuid primary key,
      invoice_id uuid not null,
      customer_id uuid not null,
      position integer not null,
      order_line_id uuid,
      description text not null,
      packs integer not null,
      pieces integer not null,
      net_grams bigint not null,
      basis text not null,
      quantity bigint not null,
      price_minor bigint not null,
      tax_ppm bigint not null,
      net_minor bigint not null,
      constraint invoice_lines_invoice foreign key (customer_id, invoice_id) references invoices (customer_id, id),
      constraint invoice_lines_position unique (invoice_id, position)
    );
    ${customerRows('invoice_lines')}
    ${appendOnly('invoice_lines')}

    create table journal_entries (
      id uuid primary key,
      number bigint generated always as identity,
      posted_on date not null,
      posted_at timestamptz not null,
      kind text not null,
      -- The fact that was posted, so that it can't be posted twice.
      source_key text not null constraint journal_entries_once unique,
      text text not null
    );
    create index journal_entries_number on journal_entries (number);
    ${appendOnly('journal_entries')}

    create table journal_lines (
      id uuid primary key,
      entry_id uuid not null references journal_entries (id),
      account text not null,
      customer_id uuid references customers (id),
      invoice_id uuid,
      currency text not null,
      debit_minor bigint not null default 0 constraint journal_lines_debit check (debit_minor >= 0),
      credit_minor bigint not null default 0 constraint journal_lines_credit check (credit_minor >= 0),
      constraint journal_lines_one_side check ((debit_minor = 0) <> (credit_minor = 0)),
      constraint journal_lines_invoice foreign key (customer_id, invoice_id) references invoices (customer_id, id)
    );
    create index journal_lines_entry on journal_lines (entry_id);
    create index journal_lines_account on journal_lines (account, customer_id);
    create index journal_lines_of_invoice on journal_lines (invoice_id);
    ${customerRows('journal_lines')}
    ${appendOnly('journal_lines')}

    create function journal_balances() returns trigger language plpgsql security definer set search_path = public as $$
    begin
      if exists (
        select 1 from journal_lines where entry_id = new.entry_id
        group by entry_id, currency having sum(debit_minor) <> sum(credit_minor)
      ) then
        raise exception 'a journal entry must balance' using errcode = 'check_violation', constraint = 'journal_balances';
      end if;
      return null;
    end $$;
    create constraint trigger journal_lines_balance after insert on journal_lines
      deferrable initially deferred for each row execute function journal_balances();

    -- What the processor told us, kept as it came; applying it is a merge that repeats may not change.
    create table processor_events (
      id text primary key,
      type text not null,
      object_id text not null,
      payload jsonb not null,
      received_at timestamptz not null,
      applied_at timestamptz
    );
    create index processor_events_received on processor_events (received_at);

    -- What the processor said it holds for us, by currency, when it was last asked.
    create table processor_balances (
      currency text primary key,
      amount_minor bigint not null,
      read_at timestamptz not null
    );

    create table processor_payouts (
      id text primary key,
      amount_minor bigint not null,
      currency text not null,
      state text not null constraint processor_payouts_state check (state in ('pending', 'in-transit', 'paid', 'failed', 'canceled')),
      created_at timestamptz not null,
      arrival_on date not null
    );

    create table processor_transactions (
      id text primary key,
      type text not null,
      source_id text,
      charge_id text,
      amount_minor bigint not null,
      fee_minor bigint not null,
      net_minor bigint not null,
      currency text not null,
      created_at timestamptz not null,
      available_at timestamptz not null,
      payout_id text references processor_payouts (id),
      constraint processor_transactions_net check (net_minor = amount_minor - fee_minor)
    );
    create index processor_transactions_payout on processor_transactions (payout_id);
    create index processor_transactions_charge on processor_transactions (charge_id);
    create index processor_transactions_created on processor_transactions (created_at);
    create index processor_payouts_created on processor_payouts (created_at);

    create table bank_statements (
      id uuid primary key,
      file_name text not null,
      file_hash text not null constraint bank_statements_once unique,
      imported_at timestamptz not null,
      imported_by uuid not null references people (id)
    );
    create table bank_lines (
      id uuid primary key,
      statement_id uuid not null references bank_statements (id),
      line_number integer not null,
      booked_on date not null,
      amount_minor bigint not null constraint bank_lines_amount check (amount_minor <> 0),
      currency text not null,
      text text not null,
      reference text,
      constraint bank_lines_place unique (statement_id, line_number)
    );
    create index bank_lines_booked on bank_lines (booked_on);

    create table bank_matches (
      bank_line_id uuid primary key references bank_lines (id),
      payout_id text not null constraint bank_matches_payout unique references processor_payouts (id),
      matched_by text not null constraint bank_matches_by check (matched_by in ('reference', 'amount-and-date')),
      difference_minor bigint not null,
      matched_at timestamptz not null
    );

    ${[
      'counters',
      'processor_events',
      'processor_payouts',
      'processor_transactions',
      'processor_balances',
      'bank_statements',
      'bank_lines',
      'bank_matches',
      'journal_entries',
    ]
      .map(
        (table) => `
    alter table ${table} enable row level security;
    alter table ${table} force row level security;
    create policy staff_and_system on ${table} using ((select caller_kind()) in ('staff', 'system'));`,
      )
      .join('')}
    ${audited('bank_matches', { key: 'bank_line_id' })}
  `,
};
