import { audited, type Migration } from '../migration';

/** One cutting day per delivery day: closed at cut-off, released to the floor, finished, locked. */
export const plant: Migration = {
  name: '0008_plant',
  sql: `
    create table cutting_days (
      id uuid primary key,
      row_version integer not null default 1,
      delivery_day date not null constraint cutting_days_delivery_day unique,
      cutting_day date not null,
      state text not null constraint cutting_days_state
        check (state in ('open', 'closed', 'planned', 'released', 'finished', 'locked')),
      closed_at timestamptz,
      closed_by uuid references people (id),
      released_at timestamptz,
      finished_at timestamptz,
      constraint cutting_days_order check (cutting_day <= delivery_day),
      constraint cutting_days_closed check ((state = 'open') = (closed_at is null))
    );
    create index cutting_days_by_state on cutting_days (state, delivery_day);
    ${audited('cutting_days')}

    alter table packs add constraint packs_order foreign key (customer_id, order_id) references orders (customer_id, id);
  `,
};
