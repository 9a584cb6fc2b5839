import { audited, type Migration } from '../migration';

/**
 * What technical staff are still writing, and what they say to each other about it. A draft is kept as it was typed, half
 * done or wrong: the tables of versions hold only what went to review.
 */
export const specificationDrafts: Migration = {
  name: '0013_specification_drafts',
  sql: `
    create table specification_drafts (
      id uuid primary key,
      row_version integer not null default 1,
      specification_id uuid not null constraint specification_drafts_one unique references specifications (id),
      -- The version it was copied from; none for a new specification.
      base_version integer,
      content jsonb not null constraint specification_drafts_content check (jsonb_typeof(content) = 'object'),
      authored_by uuid not null references people (id),
      created_at timestamptz not null,
      updated_at timestamptz not null
    );

    create table specification_comments (
      id uuid primary key,
      specification_id uuid not null references specifications (id) on delete cascade,
      -- The version it was said of; none while that is a draft.
      version integer,
      -- The field it is about, as a JSON pointer.
      pointer text,
      body text not null constraint specification_comments_body check (length(trim(body)) > 0),
      said_by uuid not null references people (id),
      said_at timestamptz not null
    );
    create index specification_comments_of on specification_comments (specification_id, said_at);
    ${audited('specification_comments')}
  `,
};
