/** What may never change again: audit events, and everything an issued revision stands on. */

/** @param {import('knex').Knex} knex */
export async function up(knex) {
  await knex.raw(`
    create function refuse_change() returns trigger language plpgsql as $$
    begin
      raise exception '% is append-only', tg_table_name using errcode = 'restrict_violation';
    end $$;
    create trigger audit_events_append_only before update or delete on audit_events
      for each row execute function refuse_change();
    create trigger audit_events_no_truncate before truncate on audit_events
      for each statement execute function refuse_change();

    create function refuse_issued_revision() returns trigger language plpgsql as $$
    begin
      if old.state not in ('issued', 'superseded') then
        return case when tg_op = 'DELETE' then old else new end;
      end if;
      if tg_op = 'UPDATE' and old.state = 'issued' and new.state = 'superseded'
        and (to_jsonb(new) - array['state', 'version', 'changed_at', 'changed_by'])
          = (to_jsonb(old) - array['state', 'version', 'changed_at', 'changed_by'])
        and new.version = old.version + 1 then
        return new;
      end if;
      raise exception 'revision % is issued and frozen', old.id using errcode = 'restrict_violation';
    end $$;
    create trigger revisions_frozen before update or delete on revisions
      for each row execute function refuse_issued_revision();

    create function refuse_part_of_issued() returns trigger language plpgsql as $$
    declare
      touched uuid := case when tg_op = 'INSERT' then new.revision_id else old.revision_id end;
    begin
      if exists (select 1 from revisions where id = touched and state in ('issued', 'superseded')) then
        raise exception '% of an issued revision are frozen', tg_table_name using errcode = 'restrict_violation';
      end if;
      return case when tg_op = 'DELETE' then old else new end;
    end $$;
    create trigger sketch_versions_frozen before insert or update or delete on sketch_versions
      for each row execute function refuse_part_of_issued();
    create trigger signatures_frozen before insert or update or delete on signatures
      for each row execute function refuse_part_of_issued();
    create trigger finding_reasons_frozen before insert or update or delete on finding_reasons
      for each row execute function refuse_part_of_issued();

    create function refuse_issued_result() returns trigger language plpgsql as $$
    declare
      touched uuid := case when tg_table_name = 'results' then (to_jsonb(old)->>'id')::uuid
                      else (to_jsonb(old)->>'result_id')::uuid end;
    begin
      if exists (select 1 from revisions where result_id = touched and state in ('issued', 'superseded')) then
        raise exception '% of an issued revision are frozen', tg_table_name using errcode = 'restrict_violation';
      end if;
      return case when tg_op = 'DELETE' then old else new end;
    end $$;
    create trigger results_frozen before update or delete on results
      for each row execute function refuse_issued_result();
    create trigger heat_fields_frozen before update or delete on heat_fields
      for each row execute function refuse_issued_result();
  `);
}

/** @param {import('knex').Knex} knex */
export async function down(knex) {
  await knex.raw(`
    drop trigger heat_fields_frozen on heat_fields;
    drop trigger results_frozen on results;
    drop function refuse_issued_result();
    drop trigger finding_reasons_frozen on finding_reasons;
    drop trigger signatures_frozen on signatures;
    drop trigger sketch_versions_frozen on sketch_versions;
    drop function refuse_part_of_issued();
    drop trigger revisions_frozen on revisions;
    drop function refuse_issued_revision();
    drop trigger audit_events_no_truncate on audit_events;
    drop trigger audit_events_append_only on audit_events;
    drop function refuse_change();
  `);
}
