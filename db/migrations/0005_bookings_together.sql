-- Oldest code served: 0000_ledger
-- Batches that come while others are being booked go together: one statement to read for all of them,
-- one to write. Code from before asks for each alone, by the functions that it knows.

-- All that booking some batches together must know, in one statement and so of one moment. What is a
-- kiosk's own names its kiosk; what they could take up next is read for those of p_next only.
create function bookings_context(
  p_site uuid,
  p_kiosks uuid[],
  p_numbers text[],
  p_sessions uuid[],
  p_ids uuid[],
  p_touched_numbers text[],
  p_touched timestamptz[],
  p_targets uuid[],
  p_tickets text[],
  p_operations text[],
  p_reach interval,
  p_now timestamptz,
  p_next uuid[]
) returns jsonb
language plpgsql stable
set search_path = public, pg_temp
set plan_cache_mode = force_generic_plan
set jit = off
as $$
declare
  touched_workers uuid[];
  touched timestamptz[];
  gap interval;
  since timestamptz;
  known jsonb;
begin
  select array_agg(t.id), array_agg(t.at)
  into touched_workers, touched
  from (
    select w.id, n.at
    from unnest(p_touched_numbers, p_touched) as n (number, at)
    join workers w on w.site_id = p_site and w.number = n.number
    union all
    -- whether a session was over asks for the shifts since it was opened
    select s.worker_id, s.opened_at
    from kiosk_sessions s
    join workers w on w.site_id = p_site and w.id = s.worker_id
      and w.number = any (p_touched_numbers)
    where s.site_id = p_site and s.id = any (p_sessions)
  ) t;
  -- a bench also shows what its worker is on already
  if p_now is not null then
    select min(s.start_at)
    into since
    from shifts s
    where s.site_id = p_site and s.worker_id = any (touched_workers) and s.end_at is null;
  end if;
  if since is not null then
    select p_tickets || array_agg(s.ticket), p_operations || array_agg(s.operation)
    into p_tickets, p_operations
    from segments s
    where s.site_id = p_site and s.worker_id = any (touched_workers) and s.end_at is null
      and s.start_at >= since and s.start_at <= p_now + interval '1 day' and s.ticket is not null;
  end if;
  -- hardly ever are any of them known, and then they are looked up one by one
  if exists (select from event_ids i where i.site_id = p_site and i.id = any (p_ids)) then
    select jsonb_agg(jsonb_build_object(
      'id', i.id, 'bodyHash', i.body_hash, 'keptFor', e.kept_for, 'questions', e.questions))
    into known
    from event_ids i
    -- one that was proved later has a second row, which counts
    cross join lateral (
      select e.kept_for, e.questions
      from clock_events e
      where e.site_id = p_site and e.id = i.id and e.received_at >= i.received_at
      order by e.kept_for is not null
      limit 1) e
    where i.site_id = p_site and i.id = any (p_ids);
  end if;
  select make_interval(secs => max(greatest(r.shift_limit_seconds, r.rest_between_shifts_seconds)))
  into gap
  from site_rules r
  where r.site_id = p_site;
  return jsonb_build_object(
    'workers', (
      select coalesce(jsonb_agg(jsonb_build_object(
        'id', w.id, 'number', w.number, 'homeCellId', w.home_cell_id,
        'roles', (
          select coalesce(jsonb_agg(jsonb_build_object('role', r.role, 'cellId', r.cell_id)), '[]')
          from account_workers a
          join accounts c on c.id = a.account_id and c.disabled_at is null
          join account_roles r on r.account_id = a.account_id and r.site_id = p_site
          where a.site_id = p_site and a.worker_id = w.id))), '[]')
      from workers w
      where w.site_id = p_site and w.number = any (p_numbers)),
    'sessions', (
      select coalesce(jsonb_agg(jsonb_build_object(
        'id', s.id, 'kioskId', s.kiosk_id, 'workerId', s.worker_id, 'openedMs', epoch_ms(s.opened_at),
        'endedMs', epoch_ms(s.ended_at))), '[]')
      from kiosk_sessions s
      where s.site_id = p_site and s.id = any (p_sessions) and s.kiosk_id = any (p_kiosks)),
    'known', coalesce(known, '[]'),
    'served', (
      select coalesce(jsonb_agg(jsonb_build_object(
        'kioskId', k.kiosk_id, 'cellId', k.cell_id, 'fromMs', epoch_ms(k.effective_from), 'position', k.position)), '[]')
      from kiosk_cells k
      where k.site_id = p_site and k.kiosk_id = any (p_kiosks)),
    'rules', site_rules_of(p_site),
    'windows', timeline_windows(
      p_site, touched_workers, touched, p_ids, p_targets, gap, p_reach, p_now),
    'facts', case
      when cardinality(p_tickets) > 0 then ticket_facts(p_site, p_tickets, p_operations)
    end,
    'next', (
      select jsonb_object_agg(k.id, next_work(p_site, k.id, p_now))
      from unnest(p_next) as k (id))
  );
end $$;
--> statement-breakpoint

-- Books what the rules in lib/ decided, all of it or nothing: locks the heads in the order of the
-- workers, checks that nobody else derived them meanwhile (BM001: read again), adds to the ledger,
-- and puts the derived rows of the windows right. Records of `again` were kept because nothing proved
-- them, and are proved now: each gets a second row, which counts.
create or replace function book(p_site uuid, p jsonb) returns void
language plpgsql
set search_path = public, pg_temp
set plan_cache_mode = force_generic_plan
set jit = off
as $$
declare
  locked integer;
  added integer;
begin
  perform make_partition('clock_events', m.month)
  from (
    select distinct date_trunc('month', e.received_at, 'UTC') as month
    from jsonb_to_recordset(p -> 'events') as e (received_at timestamptz)
  ) m;
  perform make_partition('segments', m.month)
  from (
    select distinct date_trunc('month', s.start_at, 'UTC') as month
    from jsonb_to_recordset(p -> 'segments') as s (start_at timestamptz)
  ) m;

  insert into timeline_heads as h (site_id, worker_id, version, as_of)
  select p_site, n.worker_id, n.version + 1, n.as_of
  from jsonb_to_recordset(p -> 'heads') as n (worker_id uuid, version integer, as_of timestamptz)
  order by n.worker_id
  on conflict (site_id, worker_id) do update
    set version = excluded.version, as_of = greatest(h.as_of, excluded.as_of)
    where h.version = excluded.version - 1;
  get diagnostics locked = row_count;
  if locked < jsonb_array_length(p -> 'heads') then
    raise exception 'a timeline was derived again meanwhile' using errcode = 'BM001';
  end if;

  insert into event_ids (site_id, id, received_at, body_hash)
  select p_site, e.id, e.received_at, e.body_hash
  from jsonb_to_recordset(p -> 'events') as e
    (id uuid, received_at timestamptz, body_hash text)
  order by e.id
  on conflict do nothing;
  get diagnostics added = row_count;
  if added < jsonb_array_length(p -> 'events') then
    raise exception 'an event was booked meanwhile' using errcode = 'BM001';
  end if;

  insert into clock_events
  select * from jsonb_populate_recordset(null::clock_events, p -> 'events');
  if exists (
    select from jsonb_to_recordset(p -> 'again') as a (id uuid)
    where exists (
      select from clock_events e
      where e.site_id = p_site and e.id = a.id and e.kept_for is null)) then
    raise exception 'an event was booked again meanwhile' using errcode = 'BM001';
  end if;
  insert into clock_events
  select * from jsonb_populate_recordset(null::clock_events, p -> 'again');
  insert into notes (site_id, event_id, text)
  select p_site, n.event_id, n.text
  from jsonb_to_recordset(p -> 'notes') as n (event_id uuid, text text);
  insert into kiosk_sessions (site_id, id, kiosk_id, worker_id, sealed_hash, opened_at)
  select p_site, s.id, s.kiosk_id, s.worker_id, s.sealed_hash, s.opened_at
  from jsonb_to_recordset(p -> 'sessions') as s
    (id uuid, kiosk_id uuid, worker_id uuid, sealed_hash text, opened_at timestamptz)
  on conflict do nothing;

  delete from segments s
  using jsonb_to_recordset(p -> 'gone' -> 'segments') as g
    (worker_id uuid, start_at timestamptz, item smallint)
  where s.site_id = p_site and s.start_at = g.start_at and s.worker_id = g.worker_id
    and s.item = g.item;
  delete from shifts s
  using jsonb_to_recordset(p -> 'gone' -> 'shifts') as g (worker_id uuid, start_at timestamptz)
  where s.site_id = p_site and s.worker_id = g.worker_id and s.start_at = g.start_at;
  delete from reports r
  using jsonb_to_recordset(p -> 'gone' -> 'reports') as g (id uuid)
  where r.site_id = p_site and r.id = g.id;
  delete from loose_ends l
  using jsonb_to_recordset(p -> 'gone' -> 'loose_ends') as g (code text, subject text)
  where l.site_id = p_site and l.code = g.code and l.subject = g.subject;

  insert into segments
  select * from jsonb_populate_recordset(null::segments, p -> 'segments')
  on conflict (site_id, start_at, worker_id, item) do update
    set end_at = excluded.end_at, activity = excluded.activity, ticket = excluded.ticket,
      operation = excluded.operation, code = excluded.code, weight = excluded.weight,
      seconds = excluded.seconds, cell_id = excluded.cell_id, said = excluded.said,
      event_id = excluded.event_id;
  insert into shifts
  select * from jsonb_populate_recordset(null::shifts, p -> 'shifts')
  on conflict (site_id, worker_id, start_at) do update
    set end_at = excluded.end_at, start_event_id = excluded.start_event_id,
      end_event_id = excluded.end_event_id, provisional = excluded.provisional,
      cell_id = excluded.cell_id;
  insert into reports
  select * from jsonb_populate_recordset(null::reports, p -> 'reports')
  on conflict (site_id, id) do update
    set kind = excluded.kind, worker_id = excluded.worker_id, at = excluded.at,
      ticket = excluded.ticket, operation = excluded.operation, good = excluded.good,
      rework = excluded.rework, scrap = excluded.scrap, stop = excluded.stop,
      caused_by = excluded.caused_by, defects = excluded.defects, cell_id = excluded.cell_id;
  insert into loose_ends
  select * from jsonb_populate_recordset(null::loose_ends, p -> 'loose_ends')
  on conflict (site_id, code, subject) do update
    set worker_id = excluded.worker_id, ticket = excluded.ticket, at = excluded.at,
      settled = excluded.settled;

  insert into dirty_marks (site_id, kind, key)
  select p_site, m.kind, m.key
  from jsonb_to_recordset(p -> 'marks') as m (kind text, key text);
  insert into audit_log (site_id, actor, action, subject, detail)
  select p_site, a.actor, a.action, a.subject, a.detail
  from jsonb_to_recordset(p -> 'audit') as a
    (actor text, action text, subject text, detail jsonb);
end $$;
