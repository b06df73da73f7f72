import type { Migration } from '../migration.ts';

/** What is kept of a party whose personal data were erased, until the day that was stated then. */
const KEPT = [
  'letters',
  'letter_buildings',
  'letter_acknowledgements',
  'letter_exceptions',
  'outbox_tries',
  'outbox_answers',
  'matter_messages',
  'matter_photographs',
  'matter_photograph_files',
];

function guardedBy(guard: string): string {
  return KEPT.map(
    (table) => `create or replace trigger ${table}_refuse_change before update or delete on ${table}
      for each row execute function ${guard}();`,
  ).join('\n');
}

/**
 * Letters of erased parties are kept until a day that is written down when they are erased, and are then
 * removed by a function that looks for itself whose day has passed; the serving role can do no more than
 * call it.
 */
export const migration: Migration = {
  up: async ({ sql, server }) => {
    await sql(`
      alter table outbox add column party_id uuid references parties;
      create index outbox_of_party on outbox (party_id) where party_id is not null;
      -- what went to owners before: told by the address
      update outbox o set party_id = p.id from parties p left join people s on s.id = p.person_id
        where o.letter_id is null and p.scheme_id = o.scheme_id
          and lower(o.recipient) in (lower(p.email), lower(s.email));
      alter table party_erasures disable trigger party_erasures_refuse_change;
      alter table party_erasures add column keep_until date;
      update party_erasures set keep_until = erased_at::date + interval '12 years';
      alter table party_erasures alter column keep_until set not null;
      alter table party_erasures enable trigger party_erasures_refuse_change;
      create function refuse_change_of_kept() returns trigger language plpgsql as $$
      begin
        if tg_op = 'DELETE' and current_setting('groundsill.removes_kept', true) = 'on' then
          return old;
        end if;
        raise exception 'rows of % are never changed', tg_table_name using errcode = 'restrict_violation';
      end $$;
      ${guardedBy('refuse_change_of_kept')}
      create function remove_kept_letters(of_scheme uuid)
        returns table (letters integer, matters integer, photographs text[])
        language plpgsql security definer set search_path = public, pg_temp as $$
      #variable_conflict use_column
      declare
        gone uuid[];
        gone_letters uuid[];
        gone_mails uuid[];
        gone_matters uuid[];
        gone_messages uuid[];
        hashes text[];
      begin
        select array_agg(e.party_id) into gone
          from party_erasures e join parties p on p.id = e.party_id
          where p.scheme_id = of_scheme and p.erased_at is not null and e.keep_until < current_date;
        select array_agg(id) into gone_letters from letters where party_id = any(gone);
        select array_agg(id) into gone_mails from outbox
          where party_id = any(gone) or letter_id = any(gone_letters);
        select array_agg(id) into gone_matters from matters where party_id = any(gone);
        select array_agg(id) into gone_messages from matter_messages
          where matter_id = any(gone_matters);
        perform set_config('groundsill.removes_kept', 'on', true);
        delete from outbox_answers where mail_id = any(gone_mails);
        delete from outbox_tries where mail_id = any(gone_mails);
        delete from outbox where id = any(gone_mails);
        with files as (
          delete from matter_photograph_files f using matter_photographs p
          where p.id = f.photograph_id and p.message_id = any(gone_messages) returning f.sha256
        ) select array_agg(distinct sha256) into hashes from files;
        delete from matter_photographs where message_id = any(gone_messages);
        delete from matter_messages where id = any(gone_messages);
        delete from matters where id = any(gone_matters);
        delete from letter_acknowledgements where letter_id = any(gone_letters);
        delete from letter_buildings where letter_id = any(gone_letters);
        delete from letters where id = any(gone_letters);
        delete from letter_exceptions where party_id = any(gone);
        perform set_config('groundsill.removes_kept', 'off', true);
        return query select coalesce(cardinality(gone_letters), 0),
          coalesce(cardinality(gone_matters), 0),
          array(
            select h from unnest(hashes) as h
            where not exists (select from matter_photograph_files where sha256 = h)
              and not exists (select from visit_photograph_files where sha256 = h)
          );
      end $$;
      revoke execute on function remove_kept_letters(uuid) from public;
      grant execute on function remove_kept_letters(uuid) to ${server};
    `);
  },
  down: async ({ sql }) => {
    await sql(`
      drop function remove_kept_letters(uuid);
      ${guardedBy('refuse_change')}
      drop function refuse_change_of_kept();
      alter table party_erasures drop column keep_until;
      alter table outbox drop column party_id;
    `);
  },
};
