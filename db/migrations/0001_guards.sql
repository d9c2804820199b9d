-- Oldest code served: 0000_ledger
-- What the database itself refuses, and the partitions of its two tables that grow by the month.

create function refuse_change() returns trigger
language plpgsql as $$
begin
  raise exception '% is append-only: add a record that corrects the first one', tg_table_name
    using errcode = 'restrict_violation';
end $$;
--> statement-breakpoint
create trigger clock_events_append_only before update or delete on clock_events
  for each row execute function refuse_change();
--> statement-breakpoint
create trigger clock_events_no_truncate before truncate on clock_events
  for each statement execute function refuse_change();
--> statement-breakpoint
create trigger event_ids_append_only before update or delete on event_ids
  for each row execute function refuse_change();
--> statement-breakpoint
create trigger event_ids_no_truncate before truncate on event_ids
  for each statement execute function refuse_change();
--> statement-breakpoint
create trigger audit_log_append_only before update or delete on audit_log
  for each row execute function refuse_change();
--> statement-breakpoint
create trigger audit_log_no_truncate before truncate on audit_log
  for each statement execute function refuse_change();
--> statement-breakpoint

-- A note's text may be erased, and that is all that may ever happen to it.
create function allow_erasure_only() returns trigger
language plpgsql as $$
begin
  if new.text is null and new.erased_at is not null
    and (new.site_id, new.event_id) = (old.site_id, old.event_id) then
    return new;
  end if;
  raise exception 'notes can be erased, not rewritten' using errcode = 'restrict_violation';
end $$;
--> statement-breakpoint
create trigger notes_erasure_only before update on notes
  for each row execute function allow_erasure_only();
--> statement-breakpoint
create trigger notes_append_only before delete on notes
  for each row execute function refuse_change();
--> statement-breakpoint
create trigger notes_no_truncate before truncate on notes
  for each statement execute function refuse_change();
--> statement-breakpoint

-- Makes the partition that holds an instant, unless it is there. The one thing that the app's login
-- may have made; attaching, unlike `partition of`, lets bookings of other months go on meanwhile.
create function make_partition(parent text, instant timestamptz) returns boolean
language plpgsql security definer
set search_path = public, pg_temp
set timezone = 'UTC'
as $$
declare
  month timestamptz := date_trunc('month', instant);
  part text := parent || to_char(month, '"_"YYYY"_"MM');
begin
  if parent not in ('clock_events', 'segments') then
    raise exception '% has no partitions by month', parent using errcode = 'invalid_parameter_value';
  end if;
  if to_regclass(part) is not null then
    return false;
  end if;
  perform pg_advisory_xact_lock(hashtextextended(parent, 0));
  -- by a query: to_regclass may still remember that there was none
  if exists (
    select from pg_class c where c.relname = part and c.relnamespace = 'public'::regnamespace
  ) then
    return false;
  end if;
  execute format('create table %I (like %I including defaults including constraints)', part, parent);
  execute format(
    'alter table %I attach partition %I for values from (%L) to (%L)',
    parent, part, month, month + interval '1 month');
  if parent = 'clock_events' then
    execute format(
      'create trigger no_truncate before truncate on %I for each statement execute function refuse_change()',
      part);
  end if;
  return true;
end $$;
--> statement-breakpoint
revoke all on function make_partition(text, timestamptz) from public;
--> statement-breakpoint
grant execute on function make_partition(text, timestamptz) to bookmatch_app;
