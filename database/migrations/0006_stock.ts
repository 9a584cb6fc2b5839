import { audited, customerRows, type Migration } from '../migration';

/** Lots in the chiller, and the packs that leave the scale. */
export const stock: Migration = {
  name: '0006_stock',
  sql: `
    create table lots (
      id uuid primary key,
      row_version integer not null default 1,
      code text not null constraint lots_code unique,
      node_id uuid not null references cut_nodes (id),
      supplier text not null,
      kill_date date not null,
      received_on date not null,
      use_by date,
      received_grams bigint not null constraint lots_grams check (received_grams > 0),
      received_pieces integer not null constraint lots_pieces check (received_pieces > 0),
      state text not null constraint lots_state check (state in ('received', 'on-hold', 'released', 'used-up', 'recalled')),
      hold_reason text,
      origin jsonb not null,
      constraint lots_dates check (kill_date <= received_on),
      constraint lots_hold check ((state = 'on-hold') <= (hold_reason is not null))
    );
    create index lots_of_node on lots (node_id, use_by) where state = 'released';
    ${audited('lots')}

    create sequence pack_serials start 100001;
    create table packs (
      id uuid primary key,
      serial bigint not null default nextval('pack_serials') constraint packs_serial unique,
      customer_id uuid not null references customers (id),
      order_id uuid not null,
      order_line_id uuid not null,
      version_id uuid not null references specification_versions (id),
      lot_id uuid references lots (id),
      pieces integer not null constraint packs_pieces check (pieces > 0),
      net_grams bigint not null constraint packs_net check (net_grams > 0),
      -- Grams of primal behind the net weight, by simple yield: what the pack takes from its lot.
      input_grams bigint not null constraint packs_input check (input_grams > 0),
      tare_grams bigint not null constraint packs_tare check (tare_grams >= 0),
      out_of_limits boolean not null,
      reason text,
      packed_at timestamptz not null,
      packed_by uuid not null references people (id),
      voided_at timestamptz,
      constraint packs_reason check (not out_of_limits or length(trim(reason)) > 0)
    );
    create index packs_of_order on packs (order_id, order_line_id) where voided_at is null;
    create index packs_of_lot on packs (lot_id) where voided_at is null;
    ${customerRows('packs')}
    ${audited('packs')}
  `,
};
