import type { Knex } from 'knex'

/** Mails, written by what causes them and sent by a job; and the slips that crews show at the counter. */
export async function up(knex: Knex): Promise<void> {
  await knex.raw(`
    create table mails (
      id uuid primary key default gen_random_uuid(),
      -- Counts in the order of writing.
      number bigint generated always as identity constraint mails_number_unique unique,
      person_id uuid not null references people,
      to_address text not null,
      language text not null check (language in ('en', 'es')),
      template text not null,
      subject text not null,
      text text not null,
      html text not null,
      -- What opens an account; it stands in the text until the mail has left the machine.
      secret text,
      order_id uuid references orders,
      -- What the job draws of the order and attaches before it sends.
      draws text check (draws in ('drawings', 'slip')),
      state text not null default 'queued' check (state in ('queued', 'sent', 'failed')),
      attempts integer not null default 0 check (attempts >= 0),
      last_error text,
      created_at timestamptz not null,
      sent_at timestamptz,
      constraint mails_sent_at check ((state = 'sent') = (sent_at is not null)),
      constraint mails_draw_an_order check (draws is null or order_id is not null)
    );
    create index mails_person on mails (person_id);
    create index mails_state on mails (state, number);

    create table mail_attachments (
      mail_id uuid not null references mails on delete cascade,
      -- From 1.
      position integer not null check (position > 0),
      name text not null,
      media_type text not null,
      -- Set for a picture that the HTML shows.
      content_id text,
      bytes bytea not null,
      primary key (mail_id, position)
    );

    -- One for each order that was ever ready; its code opens the hand-off at the counter.
    create table slips (
      order_id uuid primary key references orders,
      code text not null constraint slips_code_unique unique,
      created_at timestamptz not null
    );
  `)
}

export async function down(knex: Knex): Promise<void> {
  await knex.raw('drop table slips; drop table mail_attachments; drop table mails')
}
