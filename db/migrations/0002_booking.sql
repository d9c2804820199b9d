-- Oldest code served: 0000_ledger
-- One statement to read what a booking needs, one to write what it found. Neither holds a rule: the
-- rules are in lib/. They are functions so that the server keeps their plans.

create function epoch_ms(instant timestamptz) returns bigint
language sql stable strict parallel safe
return (extract(epoch from instant) * 1000)::bigint;
--> statement-breakpoint

create function segment_json(s segments) returns jsonb
language sql stable
return jsonb_build_object(
  'startMs', epoch_ms(s.start_at), 'item', s.item, 'endMs', epoch_ms(s.end_at),
  'activity', s.activity, 'ticket', s.ticket, 'operation', s.operation, 'code', s.code,
  'weight', s.weight, 'seconds', s.seconds, 'cellId', s.cell_id, 'said', s.said,
  'eventId', s.event_id);
--> statement-breakpoint

-- What the ledger and its derivation hold of some workers around the touched instants: from the last
-- gap without any event longer than p_gap to the next one (LEDGER.md 4), extended to what a
-- correction takes from elsewhere and to a shift that is still open. The worker's corrections come
-- along, with what they are about, also from outside. `truncated`: no gap within p_reach, ask again.
-- With p_now comes what only a bench shows: the day before the window, the judge's questions, notes.
-- It goes step by step so that bounds are parameters, by which partitions are left out beforehand:
-- nothing is received much before it happens, nor after the moment as of which it was derived.
create function timeline_windows(
  p_site uuid,
  p_workers uuid[],
  p_touched timestamptz[],
  p_ids uuid[],
  p_targets uuid[],
  p_gap interval,
  p_reach interval,
  p_now timestamptz
) returns jsonb
language plpgsql stable
set search_path = public, pg_temp
set plan_cache_mode = force_generic_plan
set jit = off
as $$
declare
  workers_touched uuid[];
  lows timestamptz[];
  highs timestamptz[];
  firsts timestamptz[];
  lasts timestamptz[];
  earliest timestamptz;
  latest timestamptz;
  received_from timestamptz;
  received_to timestamptz;
  corrections uuid[];
  about uuid[];
begin
  select max(h.as_of)
  into received_to
  from timeline_heads h
  where h.site_id = p_site and h.worker_id = any (p_workers);

  if cardinality(p_targets) > 0 then
    with recursive chain as (
      select e.worker_id, e.at, e.counts_at, e.target_id
      from clock_events e
      where e.site_id = p_site and e.id = any (p_targets) and e.worker_id = any (p_workers)
      union
      select e.worker_id, e.at, e.counts_at, e.target_id
      from chain c
      join clock_events e on e.site_id = p_site and e.id = c.target_id and e.worker_id = c.worker_id
    )
    select p_workers || coalesce(array_agg(t.worker_id), '{}'),
      p_touched || coalesce(array_agg(t.at), '{}')
    into p_workers, p_touched
    from (
      select c.worker_id, unnest(array[c.at, c.counts_at]) as at
      from chain c) t
    where t.at is not null;
  end if;

  select array_agg(h.worker_id), array_agg(h.low), array_agg(h.high), min(h.low), max(h.high)
  into workers_touched, lows, highs, earliest, latest
  from (
    select t.worker_id, min(t.at) as low, max(t.at) as high
    from (
      select u.worker_id, u.at
      from unnest(p_workers, p_touched) as u (worker_id, at)
      union all
      -- a correction that came before what it corrects
      select e.worker_id, e.counts_at
      from clock_events e
      where e.site_id = p_site and e.worker_id = any (p_workers)
        and e.received_at <= received_to and e.counts_at is not null
        and e.kind in ('void', 'move', 'insert', 'reassign', 'settle')
        and e.target_id = any (p_ids)
      union all
      select s.worker_id, s.start_at
      from shifts s
      where s.site_id = p_site and s.worker_id = any (p_workers) and s.end_at is null
    ) t
    group by t.worker_id
  ) h;
  received_from := earliest - p_reach - interval '2 hours';

  select array_agg(e.id), array_agg(e.target_id)
  into corrections, about
  from clock_events e
  where e.site_id = p_site and e.worker_id = any (workers_touched)
    and e.received_at >= received_from and e.received_at <= received_to
    and e.kind in ('void', 'move', 'insert', 'reassign', 'settle')
    and e.kept_for is null;

  select array_agg(b.first order by b.place), array_agg(b.last order by b.place),
    min(b.first), max(b.last)
  into firsts, lasts, earliest, latest
  from (
    select g.place,
      max(g.at) filter (where g.at <= g.low and (g.before is null or g.before > p_gap)) as first,
      min(g.at) filter (where g.at >= g.high and (g.after is null or g.after > p_gap)) as last
    from (
      select h.place, h.low, h.high, p.at, p.at - lag(p.at) over w as before,
        lead(p.at) over w - p.at as after
      from unnest(workers_touched, lows, highs) with ordinality as h (worker_id, low, high, place)
      cross join lateral (
        select e.at
        from clock_events e
        where e.site_id = p_site and e.worker_id = h.worker_id
          and e.received_at >= received_from and e.received_at <= received_to
          and e.at >= h.low - p_reach and e.at <= h.high + p_reach
          and e.kept_for is null
        union all
        select e.counts_at
        from clock_events e
        where cardinality(corrections) > 0
          and e.site_id = p_site and e.id = any (corrections) and e.worker_id = h.worker_id
          and e.received_at >= received_from and e.received_at <= received_to
          and e.counts_at >= h.low - p_reach and e.counts_at <= h.high + p_reach
        union all
        values (h.low), (h.high)
      ) p
      window w as (partition by h.place order by p.at)
    ) g
    group by g.place
  ) b;
  received_from := earliest - interval '2 hours';

  return (
    select jsonb_agg(jsonb_build_object(
      'workerId', b.worker_id,
      'firstMs', epoch_ms(b.first),
      'lastMs', epoch_ms(b.last),
      'truncated', b.first - p_gap < b.low - p_reach or b.last + p_gap > b.high + p_reach,
      'version', coalesce(h.version, 0),
      'asOfMs', epoch_ms(h.as_of),
      'homeCellId', w.home_cell_id,
      'events', (
        select jsonb_agg(jsonb_build_object(
          'id', e.id, 'atMs', epoch_ms(e.at), 'seq', coalesce(e.seq, 0), 'kiosk', e.kiosk_id,
          'session', e.session_id, 'cell', e.cell_id, 'by', e.by,
          'receivedMs', epoch_ms(e.received_at), 'weights', coalesce(e.weights, '{}'),
          'questions', coalesce(e.questions, '{}'), 'body', e.body - 'v' - 'clock',
          'note', case when p_now is not null and e.by is not null then (
            select n.text from notes n where n.site_id = p_site and n.event_id = e.id) end))
        from (
          select e.*
          from clock_events e
          where e.site_id = p_site and e.worker_id = b.worker_id
            and e.received_at >= received_from and e.received_at <= received_to
            and e.at >= b.first and e.at <= b.last
            and e.kept_for is null
          union all
          -- corrections from elsewhere, and what they are about, however old
          select e.*
          from clock_events e
          where cardinality(corrections) > 0
            and e.site_id = p_site and e.id = any (corrections || about)
            and e.worker_id = b.worker_id and (e.at < b.first or e.at > b.last)
            and e.received_at <= received_to and e.kept_for is null
        ) e),
      'planned', (
        select jsonb_agg(jsonb_build_object(
          'startMs', epoch_ms(p.start_at), 'endMs', epoch_ms(p.end_at)) order by p.start_at)
        from (
          select distinct on (s.work_on) s.start_at, s.end_at
          from planned_shifts s
          where s.site_id = p_site and s.worker_id = b.worker_id
            and s.start_at >= b.first - interval '3 days'
            and s.start_at <= b.last + interval '3 days'
          order by s.work_on, s.seq desc) p),
      'segments', (
        select jsonb_agg(segment_json(s))
        from segments s
        where s.site_id = p_site and s.worker_id = b.worker_id
          and s.start_at >= date_trunc('second', earliest) and s.start_at <= latest
          and s.start_at >= date_trunc('second', b.first) and s.start_at <= b.last),
      'shifts', (
        select jsonb_agg(jsonb_build_object(
          'startMs', epoch_ms(s.start_at), 'endMs', epoch_ms(s.end_at),
          'startEventId', s.start_event_id, 'endEventId', s.end_event_id,
          'provisional', s.provisional, 'cellId', s.cell_id))
        from shifts s
        where s.site_id = p_site and s.worker_id = b.worker_id
          and s.start_at >= date_trunc('second', b.first) and s.start_at <= b.last),
      'reports', (
        select jsonb_agg(jsonb_build_object(
          'id', r.id, 'kind', r.kind, 'atMs', epoch_ms(r.at), 'ticket', r.ticket,
          'operation', r.operation, 'good', r.good, 'rework', r.rework, 'scrap', r.scrap,
          'stop', r.stop, 'causedBy', r.caused_by, 'defects', r.defects, 'cellId', r.cell_id))
        from reports r
        where r.site_id = p_site and r.worker_id = b.worker_id
          and r.at >= date_trunc('second', b.first) and r.at <= b.last),
      'looseEnds', (
        select jsonb_agg(jsonb_build_object(
          'code', l.code, 'subject', l.subject, 'atMs', epoch_ms(l.at), 'settled', l.settled))
        from loose_ends l
        where l.site_id = p_site and l.worker_id = b.worker_id and l.source = 'fold'
          and l.at >= date_trunc('second', b.first) and l.at <= b.last),
      'judged', case when p_now is not null then (
        select jsonb_agg(jsonb_build_object(
          'code', l.code, 'subject', l.subject, 'atMs', epoch_ms(l.at), 'settled', l.settled))
        from loose_ends l
        where l.site_id = p_site and l.worker_id = b.worker_id and l.source = 'judge'
          and l.at >= date_trunc('second', b.first) and l.at <= b.last) end,
      'earlier', case when p_now is not null then (
        select jsonb_agg(segment_json(s))
        from segments s
        where s.site_id = p_site and s.worker_id = b.worker_id
          and s.start_at >= p_now - interval '2 days' and s.start_at <= latest
          and s.start_at < date_trunc('second', b.first)) end,
      -- the sign-in before this one: what others changed until then was shown at it
      'seenMs', case when p_now is not null then (
        select epoch_ms(s.opened_at)
        from kiosk_sessions s
        where s.site_id = p_site and s.worker_id = b.worker_id
        order by s.opened_at desc
        offset 1
        limit 1) end))
    from unnest(workers_touched, lows, highs, firsts, lasts) as b (worker_id, low, high, first, last)
    join workers w on w.site_id = p_site and w.id = b.worker_id
    left join timeline_heads h on h.site_id = p_site and h.worker_id = b.worker_id
  );
end $$;
--> statement-breakpoint

-- What is known of some ticket operations: what sharing time fairly and showing a bench both need.
-- Pairs whose ticket or operation is unknown are left out. `booked` is by worker: closed seconds, and
-- where the worker is on it now, since when and with which weight of which total.
create function ticket_facts(p_site uuid, p_tickets text[], p_operations text[]) returns jsonb
language plpgsql stable
set search_path = public, pg_temp
set plan_cache_mode = force_generic_plan
set jit = off
as $$
begin
  return (
    select jsonb_agg(jsonb_build_object(
      'ticket', t.number, 'operation', o.code, 'quantity', t.quantity, 'status', t.status,
      'dueOn', t.due_on, 'model', m.name, 'name', o.name, 'cellId', o.cell_id,
      'shareBy', o.share_by, 'hazards', o.hazards,
      'options', (
        select coalesce(jsonb_agg(x.name order by x.name), '[]')
        from ticket_options c
        join options x on x.site_id = p_site and x.id = c.option_id
        where c.site_id = p_site and c.ticket_id = t.id),
      'standards', (
        select coalesce(jsonb_agg(jsonb_build_object(
          'seq', s.seq, 'effectiveFrom', s.effective_from, 'option', s.option_id,
          'setupSeconds', s.setup_seconds, 'runSeconds', s.run_seconds)), '[]')
        from standards s
        where s.site_id = p_site and s.model_id = t.model_id and s.operation_id = o.id
          and (s.option_id is null or s.option_id in (
            select c.option_id from ticket_options c
            where c.site_id = p_site and c.ticket_id = t.id))),
      'good', r.good, 'scrap', r.scrap,
      'earlierScrap', (
        select coalesce(sum(e.scrap), 0)
        from ticket_operations mine
        join ticket_operations before on before.site_id = p_site and before.ticket_id = t.id
          and before.position < mine.position
        join operations other on other.site_id = p_site and other.id = before.operation_id
        join reports e on e.site_id = p_site and e.ticket = t.number and e.operation = other.code
        where mine.site_id = p_site and mine.ticket_id = t.id and mine.operation_id = o.id),
      'firstWorkMs', (
        select epoch_ms(min(s.start_at))
        from segments s
        where s.site_id = p_site and s.ticket = t.number and s.operation = o.code
          and s.activity in ('setup', 'run', 'inspect')),
      'firstReportMs', r.first_ms,
      'booked', (
        select coalesce(jsonb_agg(jsonb_build_object(
          'workerId', b.worker_id, 'seconds', b.seconds, 'sinceMs', b.since_ms,
          'weight', b.weight, 'total', b.total)), '[]')
        from (
          select s.worker_id, coalesce(sum(s.seconds), 0) as seconds,
            max(epoch_ms(s.start_at)) filter (where s.end_at is null) as since_ms,
            max(s.weight) filter (where s.end_at is null) as weight,
            max((
              select sum(i.weight) from segments i
              where i.site_id = p_site and i.start_at = s.start_at and i.worker_id = s.worker_id))
              filter (where s.end_at is null) as total
          from segments s
          where s.site_id = p_site and s.ticket = t.number and s.operation = o.code
          group by s.worker_id) b)))
    from (select distinct * from unnest(p_tickets, p_operations) as u (ticket, operation)) u
    join tickets t on t.site_id = p_site and t.number = u.ticket
    join operations o on o.site_id = p_site and o.code = u.operation
    join models m on m.site_id = p_site and m.id = t.model_id
    cross join lateral (
      select coalesce(sum(e.good), 0) as good, coalesce(sum(e.scrap), 0) as scrap,
        epoch_ms(min(e.at)) as first_ms
      from reports e
      where e.site_id = p_site and e.ticket = t.number and e.operation = o.code) r
  );
end $$;
--> statement-breakpoint

-- The rules of a site, each from its instant on.
create function site_rules_of(p_site uuid) returns jsonb
language sql stable
return (
  select coalesce(jsonb_agg(jsonb_build_object(
    'fromMs', epoch_ms(r.effective_from), 'timeZone', r.time_zone,
    'productionDayStartsAtMinutes', r.production_day_starts_at_minutes,
    'shiftLimitSeconds', r.shift_limit_seconds, 'sinceLimitSeconds', r.since_limit_seconds,
    'restMaxSeconds', r.rest_max_seconds, 'mealMaxSeconds', r.meal_max_seconds,
    'restBetweenShiftsSeconds', r.rest_between_shifts_seconds) order by r.effective_from, r.id), '[]')
  from site_rules r
  where r.site_id = p_site);
--> statement-breakpoint

-- What a kiosk's cells could take up next: open tickets by due date, the oldest first within a day.
create function next_work(p_site uuid, p_kiosk uuid, p_now timestamptz) returns jsonb
language plpgsql stable
set search_path = public, pg_temp
set plan_cache_mode = force_generic_plan
set jit = off
as $$
begin
  return (
    select coalesce(jsonb_agg(jsonb_build_object(
      'ticket', n.number, 'operation', n.code, 'name', n.name, 'model', n.model,
      'options', (
        select coalesce(jsonb_agg(x.name order by x.name), '[]')
        from ticket_options c
        join options x on x.site_id = p_site and x.id = c.option_id
        where c.site_id = p_site and c.ticket_id = n.id),
      'quantity', n.quantity, 'openQuantity', n.open_quantity, 'dueOn', n.due_on)
      order by n.due_on, n.seq), '[]')
    from (
      select t.id, t.seq, t.number, t.quantity, t.due_on, o.code, o.name, m.name as model,
        p.open_quantity
      from kiosk_cells k
      join operations o on o.site_id = p_site and o.cell_id = k.cell_id
      join ticket_operations p on p.site_id = p_site and p.operation_id = o.id
        and p.state = 'ready'
      join tickets t on t.site_id = p_site and t.id = p.ticket_id and t.status = 'open'
      join models m on m.site_id = p_site and m.id = t.model_id
      where k.site_id = p_site and k.kiosk_id = p_kiosk
        and k.effective_from = (
          select max(l.effective_from) from kiosk_cells l
          where l.site_id = p_site and l.kiosk_id = p_kiosk and l.effective_from <= p_now)
      order by t.due_on, t.seq
      limit 8) n
  );
end $$;
--> statement-breakpoint

-- All that booking a batch must know, in one statement and so of one moment.
create function booking_context(
  p_site uuid,
  p_kiosk uuid,
  p_numbers text[],
  p_sessions uuid[],
  p_ids uuid[],
  p_touched_numbers text[],
  p_touched timestamptz[],
  p_targets uuid[],
  p_tickets text[],
  p_operations text[],
  p_reach interval,
  p_now timestamptz
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
    join clock_events e on e.site_id = p_site and e.received_at = i.received_at and e.id = i.id
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
        'id', s.id, 'workerId', s.worker_id, 'openedMs', epoch_ms(s.opened_at),
        'endedMs', epoch_ms(s.ended_at))), '[]')
      from kiosk_sessions s
      where s.site_id = p_site and s.id = any (p_sessions) and s.kiosk_id = p_kiosk),
    'known', coalesce(known, '[]'),
    'served', (
      select coalesce(jsonb_agg(jsonb_build_object(
        'cellId', k.cell_id, 'fromMs', epoch_ms(k.effective_from), 'position', k.position)), '[]')
      from kiosk_cells k
      where k.site_id = p_site and k.kiosk_id = p_kiosk),
    'rules', site_rules_of(p_site),
    'windows', timeline_windows(
      p_site, touched_workers, touched, p_ids, p_targets, gap, p_reach, p_now),
    'facts', case
      when cardinality(p_tickets) > 0 then ticket_facts(p_site, p_tickets, p_operations)
    end,
    'next', case when p_now is not null then next_work(p_site, p_kiosk, p_now) end
  );
end $$;
--> statement-breakpoint

-- Books what the rules in lib/ decided, all of it or nothing: locks the heads in the order of the
-- workers, checks that nobody else derived them meanwhile (BM001: read again), adds to the ledger,
-- and puts the derived rows of the windows right.
create function book(p_site uuid, p jsonb) returns void
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
--> statement-breakpoint

-- All that is booked to some tickets, known or not, and what was last made of it: what judging them
-- and showing them both need. One entry a number, in their order.
create function ticket_books(p_site uuid, p_numbers text[]) returns jsonb
language plpgsql stable
set search_path = public, pg_temp
set plan_cache_mode = force_generic_plan
set jit = off
as $$
begin
  return (
    select coalesce(jsonb_agg(jsonb_build_object(
      'ticket', n.number,
      'known', case when t.id is not null then jsonb_build_object(
        'id', t.id, 'quantity', t.quantity, 'status', t.status, 'dueOn', t.due_on,
        'finishedMs', epoch_ms(t.finished_at), 'model', m.name,
        'options', (
          select coalesce(jsonb_agg(x.name order by x.name), '[]')
          from ticket_options c
          join options x on x.site_id = p_site and x.id = c.option_id
          where c.site_id = p_site and c.ticket_id = t.id)) end,
      'operations', (
        select coalesce(jsonb_agg(jsonb_build_object(
          'id', p.id, 'operation', o.code, 'name', o.name, 'stage', o.stage, 'cellId', o.cell_id,
          'cell', c.name, 'hazards', o.hazards, 'state', p.state, 'good', p.good,
          'rework', p.rework, 'scrap', p.scrap, 'openQuantity', p.open_quantity,
          'actualSeconds', p.actual_seconds, 'firstWorkMs', epoch_ms(p.first_work_at),
          'finishedMs', epoch_ms(p.finished_at),
          'standards', (
            select coalesce(jsonb_agg(jsonb_build_object(
              'seq', s.seq, 'effectiveFrom', s.effective_from, 'option', s.option_id,
              'setupSeconds', s.setup_seconds, 'runSeconds', s.run_seconds)), '[]')
            from standards s
            where s.site_id = p_site and s.model_id = t.model_id and s.operation_id = o.id
              and (s.option_id is null or s.option_id in (
                select w.option_id from ticket_options w
                where w.site_id = p_site and w.ticket_id = t.id)))) order by p.position), '[]')
        from ticket_operations p
        join operations o on o.site_id = p_site and o.id = p.operation_id
        join cells c on c.site_id = p_site and c.id = o.cell_id
        where p.site_id = p_site and p.ticket_id = t.id),
      'reports', (
        select coalesce(jsonb_agg(jsonb_build_object(
          'event', r.id, 'kind', r.kind, 'worker', r.worker_id, 'atMs', epoch_ms(r.at),
          'ticket', r.ticket, 'operation', r.operation, 'good', r.good, 'rework', r.rework,
          'scrap', r.scrap, 'stop', r.stop, 'causedBy', r.caused_by, 'defects', r.defects,
          'cell', r.cell_id)), '[]')
        from reports r
        where r.site_id = p_site and r.ticket = n.number),
      'work', (
        select coalesce(jsonb_agg(jsonb_build_object(
          'worker', s.worker_id, 'number', w.number, 'name', w.name, 'operation', s.operation,
          'activity', s.activity, 'startMs', epoch_ms(s.start_at), 'endMs', epoch_ms(s.end_at),
          'seconds', s.seconds, 'item', s.item, 'cell', s.cell_id, 'event', s.event_id,
          'weights', case when s.end_at is null then (
            select jsonb_agg(i.weight order by i.item)
            from segments i
            where i.site_id = p_site and i.start_at = s.start_at and i.worker_id = s.worker_id)
            end)), '[]')
        from segments s
        join workers w on w.site_id = p_site and w.id = s.worker_id
        where s.site_id = p_site and s.ticket = n.number),
      'looseEnds', (
        select coalesce(jsonb_agg(jsonb_build_object(
          'code', l.code, 'subject', l.subject, 'worker', l.worker_id, 'atMs', epoch_ms(l.at),
          'settled', l.settled)), '[]')
        from loose_ends l
        where l.site_id = p_site and l.ticket = n.number and l.source = 'judge'),
      -- an answer stands unless it was itself taken back
      'settled', (
        select coalesce(jsonb_agg(distinct e.body ->> 'end'), '[]')
        from clock_events e
        where e.site_id = p_site and e.kind = 'settle' and e.kept_for is null
          and e.worker_id in (
            select s.worker_id from segments s where s.site_id = p_site and s.ticket = n.number
            union
            select r.worker_id from reports r where r.site_id = p_site and r.ticket = n.number)
          and e.target_id in (
            select s.event_id from segments s where s.site_id = p_site and s.ticket = n.number
            union
            select r.id from reports r where r.site_id = p_site and r.ticket = n.number)
          and not exists (
            select from clock_events v
            where v.site_id = p_site and v.worker_id = e.worker_id and v.kind = 'void'
              and v.kept_for is null and v.target_id = e.id)))
      order by n.place), '[]')
    from unnest(p_numbers) with ordinality as n (number, place)
    left join tickets t on t.site_id = p_site and t.number = n.number
    left join models m on m.site_id = p_site and m.id = t.model_id
  );
end $$;
--> statement-breakpoint

-- Keeps what the judge made of some tickets: only what differs from what was kept.
create function keep_judgement(p_site uuid, p jsonb) returns void
language plpgsql
set search_path = public, pg_temp
set plan_cache_mode = force_generic_plan
set jit = off
as $$
begin
  update ticket_operations o
  set state = n.state, good = n.good, rework = n.rework, scrap = n.scrap,
    open_quantity = n.open_quantity, actual_seconds = n.actual_seconds,
    first_work_at = n.first_work_at, finished_at = n.finished_at
  from jsonb_to_recordset(p -> 'operations') as n (
    id uuid, state text, good integer, rework integer, scrap integer, open_quantity integer,
    actual_seconds integer, first_work_at timestamptz, finished_at timestamptz)
  where o.site_id = p_site and o.id = n.id;
  update tickets t
  set status = n.status, finished_at = n.finished_at
  from jsonb_to_recordset(p -> 'tickets') as n (id uuid, status text, finished_at timestamptz)
  where t.site_id = p_site and t.id = n.id;
  delete from loose_ends l
  using jsonb_to_recordset(p -> 'gone') as g (code text, subject text)
  where l.site_id = p_site and l.code = g.code and l.subject = g.subject;
  insert into loose_ends (site_id, code, subject, source, worker_id, ticket, at, settled)
  select p_site, n.code, n.subject, 'judge', n.worker_id, n.ticket, n.at, n.settled
  from jsonb_to_recordset(p -> 'loose_ends') as n
    (code text, subject text, worker_id uuid, ticket text, at timestamptz, settled boolean)
  on conflict (site_id, code, subject) do update
    set worker_id = excluded.worker_id, ticket = excluded.ticket, at = excluded.at,
      settled = excluded.settled;
end $$;
