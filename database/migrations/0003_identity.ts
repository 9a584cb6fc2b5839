import { audited, customerRows, type Migration } from '../migration';

/** People, the customers they buy for, and what proves who they are. */
export const identity: Migration = {
  name: '0003_identity',
  sql: `
    create table customer_groups (
      id uuid primary key,
      row_version integer not null default 1,
      name text not null constraint customer_groups_name unique
    );

    create sequence customer_numbers start 1001;
    create table customers (
      id uuid primary key,
      row_version integer not null default 1,
      number bigint not null default nextval('customer_numbers') constraint customers_number unique,
      name text not null constraint customers_name check (length(trim(name)) between 1 and 120),
      kind text not null constraint customers_kind
        check (kind in ('restaurant', 'hotel', 'pub', 'caterer', 'butcher', 'farm-shop', 'school', 'care-home')),
      group_id uuid references customer_groups (id),
      invoice_email text not null,
      billing_address text not null,
      vat_number text,
      terms_days integer not null default 14 constraint customers_terms_days check (terms_days between 0 and 120),
      terms_from text not null default 'invoice' constraint customers_terms_from
        check (terms_from in ('invoice', 'end-of-week', 'end-of-month')),
      active boolean not null default true,
      created_at timestamptz not null
    );
    create index customers_by_name on customers (lower(name), id);
    create index customers_group on customers (group_id);
    ${customerRows('customers', 'id')}
    ${audited('customers')}

    create table sites (
      id uuid primary key,
      row_version integer not null default 1,
      customer_id uuid not null references customers (id),
      name text not null,
      address text not null,
      postcode text not null,
      contact_name text,
      phone text,
      access_notes text,
      active boolean not null default true,
      constraint sites_of_customer unique (customer_id, id)
    );
    ${customerRows('sites', 'customer_id', 'id')}
    ${audited('sites')}

    create table people (
      id uuid primary key,
      row_version integer not null default 1,
      email text not null,
      name text not null,
      customer_id uuid references customers (id),
      roles text[] not null constraint people_roles check (
        cardinality(roles) > 0
        and roles <@ '{buyer,buyer_owner,rep,technical,planner,floor,accounts,admin}'::text[]
      ),
      all_sites boolean not null default true,
      all_customers boolean not null default true,
      password_hash text,
      active boolean not null default true,
      created_at timestamptz not null,
      constraint people_of_customer unique (customer_id, id),
      constraint people_buyers_have_a_customer check (
        (customer_id is not null and roles <@ '{buyer,buyer_owner}'::text[])
        or (customer_id is null and not roles && '{buyer,buyer_owner}'::text[])
      )
    );
    create unique index people_email on people (lower(email));
    create index people_customer on people (customer_id);
    alter table people enable row level security;
    alter table people force row level security;
    create policy known_to_caller on people using (
      (select caller_sees_all())
      or customer_id = any ((select caller_customers())::uuid[])
      or id = (select caller_person())
      or (customer_id is null and (select caller_kind()) = 'staff')
    );
    ${audited('people', { secret: ['password_hash'] })}

    create table person_sites (
      person_id uuid not null,
      customer_id uuid not null,
      site_id uuid not null,
      primary key (person_id, site_id),
      constraint person_sites_person foreign key (customer_id, person_id) references people (customer_id, id),
      constraint person_sites_site foreign key (customer_id, site_id) references sites (customer_id, id)
    );
    create index person_sites_site on person_sites (customer_id, site_id);
    ${customerRows('person_sites')}
    ${audited('person_sites', { key: 'person_id' })}

    create table staff_customers (
      person_id uuid not null references people (id),
      customer_id uuid not null references customers (id),
      primary key (person_id, customer_id)
    );
    create index staff_customers_customer on staff_customers (customer_id);
    ${customerRows('staff_customers')}
    ${audited('staff_customers', { key: 'person_id' })}

    -- One row per browser that is signed in; the tokens in its chain rotate.
    create table sign_in_sessions (
      id uuid primary key,
      person_id uuid not null references people (id),
      application text not null constraint sign_in_sessions_application check (application in ('storefront', 'admin')),
      device text not null,
      created_at timestamptz not null,
      last_used_at timestamptz not null,
      expires_at timestamptz not null,
      ended_at timestamptz,
      ended_because text
    );
    create index sign_in_sessions_person on sign_in_sessions (person_id) where ended_at is null;
    -- Whoever may see a person may see, and end, that person's sessions; what proves a sign-in stays with the system.
    alter table sign_in_sessions enable row level security;
    alter table sign_in_sessions force row level security;
    create policy of_known_people on sign_in_sessions using (
      (select caller_kind()) = 'system' or exists (select from people p where p.id = person_id)
    );

    create table refresh_tokens (
      token_hash text primary key,
      session_id uuid not null references sign_in_sessions (id) on delete cascade,
      -- Counts up along the chain, so that the direct predecessor of the newest can be told.
      generation integer not null,
      issued_at timestamptz not null,
      replaced_at timestamptz
    );
    create index refresh_tokens_session on refresh_tokens (session_id);

    create table one_time_tokens (
      token_hash text primary key,
      person_id uuid not null references people (id),
      purpose text not null constraint one_time_tokens_purpose check (purpose in ('invitation', 'password-reset')),
      created_at timestamptz not null,
      expires_at timestamptz not null,
      used_at timestamptz
    );
    create index one_time_tokens_person on one_time_tokens (person_id, purpose);

    -- Failures are counted by address and source together, so that nobody can lock out somebody else.
    create table sign_in_failures (
      id bigint generated always as identity primary key,
      email_hash text not null,
      source_hash text not null,
      failed_at timestamptz not null
    );
    create index sign_in_failures_recent on sign_in_failures (email_hash, source_hash, failed_at);

    ${['refresh_tokens', 'one_time_tokens', 'sign_in_failures']
      .map(
        (table) => `
    alter table ${table} enable row level security;
    alter table ${table} force row level security;
    create policy system_only on ${table} using ((select caller_kind()) = 'system');`,
      )
      .join('')}
    -- A person who invites another writes the invitation, but can't read it back.
    create policy given_by_caller on one_time_tokens for insert with check (
      purpose = 'invitation' and exists (select from people p where p.id = person_id)
    );

    alter table documents add constraint documents_customer_fk foreign key (customer_id) references customers (id);
    ${customerRows('documents')}
    ${customerRows('mails')}
  `,
};
