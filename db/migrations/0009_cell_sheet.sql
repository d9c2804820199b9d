-- Oldest code served: 0000_ledger
CREATE TABLE "routing_steps" (
	"site_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"routing_operation_id" uuid NOT NULL,
	"position" integer NOT NULL,
	"step" text NOT NULL,
	"name" text NOT NULL,
	"seconds" integer NOT NULL,
	CONSTRAINT "routing_steps_site_id_id_pk" PRIMARY KEY("site_id","id"),
	CONSTRAINT "routing_steps_siteId_routingOperationId_position_unique" UNIQUE("site_id","routing_operation_id","position"),
	CONSTRAINT "routing_steps_siteId_routingOperationId_step_unique" UNIQUE("site_id","routing_operation_id","step"),
	CONSTRAINT "routing_steps_seconds" CHECK ("routing_steps"."seconds" > 0)
);
--> statement-breakpoint
ALTER TABLE "routing_steps" ADD CONSTRAINT "routing_steps_site_id_routing_operation_id_routing_operations_site_id_id_fk" FOREIGN KEY ("site_id","routing_operation_id") REFERENCES "public"."routing_operations"("site_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
CREATE INDEX "clock_events_steps" ON "clock_events" USING btree ("site_id",(body ->> 'ticket')) WHERE kind in ('step-done', 'step-open', 'step-skip', 'hand-over');--> statement-breakpoint
CREATE INDEX "clock_events_inserted" ON "clock_events" USING btree ("site_id",(body #>> '{event,ticket}')) WHERE kind = 'insert';--> statement-breakpoint
-- The steps of a ticket's operations: of the routing in force when it was made, else of the first one.
create function steps_of_ticket(p_site uuid, p_ticket uuid)
returns table (operation_id uuid, "position" integer, step text, name text, seconds integer)
language sql stable
set search_path = public, pg_temp
as $$
  select p.operation_id, s.position, s.step, s.name, s.seconds
  from tickets t
  join lateral (
    select r.id
    from routings r
    where r.site_id = p_site and r.model_id = t.model_id
    order by r.created_at <= t.created_at desc,
      case when r.created_at <= t.created_at then -r.revision else r.revision end
    limit 1) r on true
  join routing_operations p on p.site_id = p_site and p.routing_id = r.id
  join routing_steps s on s.site_id = p_site and s.routing_operation_id = p.id
  where t.site_id = p_site and t.id = p_ticket
$$;
--> statement-breakpoint
-- Steps and all that was said of them, for the tickets of some numbers that have steps, in one
-- statement. What corrects such an event is its own worker's: a lead's void or move at any time, an
-- undo within ten seconds of it.
create function ticket_steps(p_site uuid, p_numbers text[]) returns jsonb
language plpgsql stable
set search_path = public, pg_temp
set plan_cache_mode = force_generic_plan
set jit = off
as $$
begin
  return (
    with stepped as (
      select t.number, o.code, s.position, s.step, s.name, s.seconds
      from tickets t
      cross join lateral steps_of_ticket(p_site, t.id) s
      join operations o on o.site_id = p_site and o.id = s.operation_id
      where t.site_id = p_site and t.number = any (p_numbers)),
    said as (
      select n.number, e.id, e.worker_id, e.at
      from (select distinct number from stepped) n
      join clock_events e on e.site_id = p_site and e.body ->> 'ticket' = n.number
        and e.kind in ('step-done', 'step-open', 'step-skip', 'hand-over') and e.kept_for is null
      union
      select n.number, e.id, e.worker_id, e.at
      from (select distinct number from stepped) n
      join clock_events e on e.site_id = p_site and e.body #>> '{event,ticket}' = n.number
        and e.kind = 'insert' and e.kept_for is null),
    corrected as (
      select s.number, c.id, c.worker_id, c.at
      from said s
      join clock_events c on c.site_id = p_site and c.worker_id = s.worker_id
        and c.kind in ('void', 'move') and c.target_id = s.id and c.kept_for is null),
    undone as (
      select s.number, c.id
      from (select * from said union select * from corrected) s
      join clock_events c on c.site_id = p_site and c.worker_id = s.worker_id
        and c.at between s.at - interval '10 seconds' and s.at + interval '10 seconds'
        and c.kind = 'undo' and c.target_id = s.id and c.kept_for is null)
    select coalesce(jsonb_agg(jsonb_build_object(
      'ticket', n.number,
      'steps', (
        select jsonb_agg(jsonb_build_object(
          'operation', s.code, 'step', s.step, 'name', s.name, 'seconds', s.seconds)
          order by s.code, s.position)
        from stepped s
        where s.number = n.number),
      'said', (
        select coalesce(jsonb_agg(jsonb_build_object(
          'id', e.id, 'atMs', epoch_ms(e.at), 'seq', e.seq, 'kiosk', e.kiosk_id,
          'session', e.session_id, 'cell', e.cell_id, 'by', e.by,
          'receivedMs', epoch_ms(e.received_at), 'weights', coalesce(e.weights, '{}'),
          'questions', coalesce(e.questions, '{}'), 'body', e.body, 'worker', e.worker_number,
          'note', k.text)), '[]')
        from (
          select s.id from said s where s.number = n.number
          union select c.id from corrected c where c.number = n.number
          union select u.id from undone u where u.number = n.number) own
        join clock_events e on e.site_id = p_site and e.id = own.id
        left join notes k on k.site_id = p_site and k.event_id = e.id))), '[]')
    from (select distinct number from stepped) n
  );
end $$;
--> statement-breakpoint
-- As before, with the steps of the operation: a step that is tapped off is booked with its weight.
create or replace function ticket_facts(p_site uuid, p_tickets text[], p_operations text[]) returns jsonb
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
      'steps', (
        select coalesce(jsonb_agg(jsonb_build_object('step', s.step, 'seconds', s.seconds)), '[]')
        from steps_of_ticket(p_site, t.id) s
        where s.operation_id = o.id),
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
