-- Oldest code served: 0000_ledger
CREATE TABLE "attendance_days" (
	"site_id" uuid NOT NULL,
	"day" date NOT NULL,
	"cell_id" uuid NOT NULL,
	"setup_seconds" integer NOT NULL,
	"run_seconds" integer NOT NULL,
	"rework_seconds" integer NOT NULL,
	"inspect_seconds" integer NOT NULL,
	"indirect_seconds" integer NOT NULL,
	"rest_seconds" integer NOT NULL,
	"unassigned_seconds" integer NOT NULL,
	"meal_seconds" integer NOT NULL,
	CONSTRAINT "attendance_days_site_id_day_cell_id_pk" PRIMARY KEY("site_id","day","cell_id")
);
--> statement-breakpoint
CREATE TABLE "booked_days" (
	"site_id" uuid NOT NULL,
	"day" date NOT NULL,
	"cell_id" uuid NOT NULL,
	"operation" text NOT NULL,
	"model_id" uuid NOT NULL,
	"option_ids" uuid[] NOT NULL,
	"activity" text NOT NULL,
	"seconds" integer NOT NULL,
	"no_standard_seconds" integer NOT NULL,
	"elsewhere_seconds" integer NOT NULL,
	"pieces" integer NOT NULL,
	CONSTRAINT "booked_days_pk" PRIMARY KEY("site_id","day","operation","cell_id","model_id","option_ids","activity")
);
--> statement-breakpoint
CREATE TABLE "booked_parts" (
	"site_id" uuid NOT NULL,
	"ticket" text NOT NULL,
	"operation" text NOT NULL,
	"day" date NOT NULL,
	"cell_id" uuid NOT NULL,
	"activity" text NOT NULL,
	"model_id" uuid NOT NULL,
	"option_ids" uuid[] NOT NULL,
	"seconds" integer NOT NULL,
	"no_standard_seconds" integer NOT NULL,
	"elsewhere_seconds" integer NOT NULL,
	"pieces" integer NOT NULL,
	"first_at" timestamp (3) with time zone,
	CONSTRAINT "booked_parts_site_id_ticket_operation_day_cell_id_activity_pk" PRIMARY KEY("site_id","ticket","operation","day","cell_id","activity")
);
--> statement-breakpoint
CREATE TABLE "matched_days" (
	"site_id" uuid NOT NULL,
	"day" date NOT NULL,
	"cell_id" uuid NOT NULL,
	"operation" text NOT NULL,
	"model_id" uuid NOT NULL,
	"option_ids" uuid[] NOT NULL,
	"pieces" integer NOT NULL,
	"actual_seconds" integer NOT NULL,
	"rework_seconds" integer NOT NULL,
	"elsewhere_seconds" integer NOT NULL,
	"no_standard_seconds" integer NOT NULL,
	"no_standard_rework_seconds" integer NOT NULL,
	"earned_seconds" integer NOT NULL,
	"report_earned_seconds" integer NOT NULL,
	CONSTRAINT "matched_days_pk" PRIMARY KEY("site_id","day","operation","cell_id","model_id","option_ids")
);
--> statement-breakpoint
CREATE TABLE "matched_parts" (
	"site_id" uuid NOT NULL,
	"ticket" text NOT NULL,
	"operation" text NOT NULL,
	"rework" text NOT NULL,
	"cell_id" uuid NOT NULL,
	"day" date NOT NULL,
	"model_id" uuid NOT NULL,
	"option_ids" uuid[] NOT NULL,
	"pieces" integer NOT NULL,
	"actual_seconds" integer NOT NULL,
	"rework_seconds" integer NOT NULL,
	"elsewhere_seconds" integer NOT NULL,
	"no_standard_seconds" integer NOT NULL,
	"no_standard_rework_seconds" integer NOT NULL,
	"earned_seconds" integer NOT NULL,
	"report_earned_seconds" integer NOT NULL,
	CONSTRAINT "matched_parts_site_id_ticket_operation_rework_cell_id_pk" PRIMARY KEY("site_id","ticket","operation","rework","cell_id")
);
--> statement-breakpoint
CREATE TABLE "over_parts" (
	"site_id" uuid NOT NULL,
	"ticket" text NOT NULL,
	"operation" text NOT NULL,
	"cell_id" uuid NOT NULL,
	"model_id" uuid NOT NULL,
	"option_ids" uuid[] NOT NULL,
	"standard_seconds" integer NOT NULL,
	"actual_seconds" integer NOT NULL,
	CONSTRAINT "over_parts_site_id_ticket_operation_pk" PRIMARY KEY("site_id","ticket","operation")
);
--> statement-breakpoint
ALTER TABLE "operations" ADD COLUMN "setup_earned" text DEFAULT 'first-good' NOT NULL;--> statement-breakpoint
ALTER TABLE "attendance_days" ADD CONSTRAINT "attendance_days_site_id_sites_id_fk" FOREIGN KEY ("site_id") REFERENCES "public"."sites"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "booked_days" ADD CONSTRAINT "booked_days_site_id_sites_id_fk" FOREIGN KEY ("site_id") REFERENCES "public"."sites"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "booked_parts" ADD CONSTRAINT "booked_parts_site_id_sites_id_fk" FOREIGN KEY ("site_id") REFERENCES "public"."sites"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "matched_days" ADD CONSTRAINT "matched_days_site_id_sites_id_fk" FOREIGN KEY ("site_id") REFERENCES "public"."sites"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "matched_parts" ADD CONSTRAINT "matched_parts_site_id_sites_id_fk" FOREIGN KEY ("site_id") REFERENCES "public"."sites"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "over_parts" ADD CONSTRAINT "over_parts_site_id_sites_id_fk" FOREIGN KEY ("site_id") REFERENCES "public"."sites"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
CREATE INDEX "booked_parts_site_id_operation_day_index" ON "booked_parts" USING btree ("site_id","operation","day");--> statement-breakpoint
CREATE INDEX "matched_parts_site_id_operation_day_index" ON "matched_parts" USING btree ("site_id","operation","day");--> statement-breakpoint
ALTER TABLE "operations" ADD CONSTRAINT "operations_setup_earned" CHECK ("operations"."setup_earned" in ('first-good', 'when-booked'));--> statement-breakpoint

-- Keeps the parts that judged tickets give to standard and actual: only what differs, with its marks.
create function keep_parts(p_site uuid, p jsonb) returns void
language plpgsql
set search_path = public, pg_temp
set plan_cache_mode = force_generic_plan
set jit = off
as $$
begin
  delete from booked_parts b
  using jsonb_to_recordset(p -> 'booked' -> 'gone') as g
    (ticket text, operation text, day date, cell uuid, activity text)
  where b.site_id = p_site and b.ticket = g.ticket and b.operation = g.operation
    and b.day = g.day and b.cell_id = g.cell and b.activity = g.activity;
  insert into booked_parts (site_id, ticket, operation, day, cell_id, activity, model_id,
    option_ids, seconds, no_standard_seconds, elsewhere_seconds, pieces, first_at)
  select p_site, n.ticket, n.operation, n.day, n.cell, n.activity, n."modelId", n."optionIds",
    n.seconds, n."noStandardSeconds", n."elsewhereSeconds", n.pieces,
    to_timestamp(n."firstMs" / 1000.0)
  from jsonb_to_recordset(p -> 'booked' -> 'changed') as n
    (ticket text, operation text, day date, cell uuid, activity text, "modelId" uuid,
    "optionIds" uuid[], seconds integer, "noStandardSeconds" integer, "elsewhereSeconds" integer,
    pieces integer, "firstMs" bigint)
  on conflict (site_id, ticket, operation, day, cell_id, activity) do update
    set model_id = excluded.model_id, option_ids = excluded.option_ids,
      seconds = excluded.seconds, no_standard_seconds = excluded.no_standard_seconds,
      elsewhere_seconds = excluded.elsewhere_seconds, pieces = excluded.pieces,
      first_at = excluded.first_at;

  delete from matched_parts m
  using jsonb_to_recordset(p -> 'matched' -> 'gone') as g
    (ticket text, operation text, rework text, cell uuid)
  where m.site_id = p_site and m.ticket = g.ticket and m.operation = g.operation
    and m.rework = g.rework and m.cell_id = g.cell;
  insert into matched_parts (site_id, ticket, operation, rework, cell_id, day, model_id, option_ids,
    pieces, actual_seconds, rework_seconds, elsewhere_seconds, no_standard_seconds,
    no_standard_rework_seconds, earned_seconds, report_earned_seconds)
  select p_site, n.ticket, n.operation, n.rework, n.cell, n.day, n."modelId", n."optionIds",
    n.pieces, n."actualSeconds", n."reworkSeconds", n."elsewhereSeconds", n."noStandardSeconds",
    n."noStandardReworkSeconds", n."earnedSeconds", n."reportEarnedSeconds"
  from jsonb_to_recordset(p -> 'matched' -> 'changed') as n
    (ticket text, operation text, rework text, cell uuid, day date, "modelId" uuid,
    "optionIds" uuid[], pieces integer, "actualSeconds" integer, "reworkSeconds" integer,
    "elsewhereSeconds" integer, "noStandardSeconds" integer, "noStandardReworkSeconds" integer,
    "earnedSeconds" integer, "reportEarnedSeconds" integer)
  on conflict (site_id, ticket, operation, rework, cell_id) do update
    set day = excluded.day, model_id = excluded.model_id, option_ids = excluded.option_ids,
      pieces = excluded.pieces, actual_seconds = excluded.actual_seconds,
      rework_seconds = excluded.rework_seconds, elsewhere_seconds = excluded.elsewhere_seconds,
      no_standard_seconds = excluded.no_standard_seconds,
      no_standard_rework_seconds = excluded.no_standard_rework_seconds,
      earned_seconds = excluded.earned_seconds,
      report_earned_seconds = excluded.report_earned_seconds;

  delete from over_parts o
  using jsonb_to_recordset(p -> 'over' -> 'gone') as g (ticket text, operation text)
  where o.site_id = p_site and o.ticket = g.ticket and o.operation = g.operation;
  insert into over_parts (site_id, ticket, operation, cell_id, model_id, option_ids,
    standard_seconds, actual_seconds)
  select p_site, n.ticket, n.operation, n.cell, n."modelId", n."optionIds", n."standardSeconds",
    n."actualSeconds"
  from jsonb_to_recordset(p -> 'over' -> 'changed') as n
    (ticket text, operation text, cell uuid, "modelId" uuid, "optionIds" uuid[],
    "standardSeconds" integer, "actualSeconds" integer)
  on conflict (site_id, ticket, operation) do update
    set cell_id = excluded.cell_id, model_id = excluded.model_id,
      option_ids = excluded.option_ids, standard_seconds = excluded.standard_seconds,
      actual_seconds = excluded.actual_seconds;

  insert into dirty_marks (site_id, kind, key)
  select p_site, m.kind, m.key
  from jsonb_to_recordset(p -> 'marks') as m (kind text, key text);
end $$;
--> statement-breakpoint

-- What was booked before counts too: the background judges every ticket again and sums every day.
insert into dirty_marks (site_id, kind, key)
select site_id, 'ticket', number from tickets
union
select site_id, 'ticket', ticket from segments where ticket is not null;
--> statement-breakpoint
insert into dirty_marks (site_id, kind, key)
select site_id, 'attendance',
  concat_ws(' ', epoch_ms(min(start_at)), epoch_ms(max(end_at)), cell_id)
from segments
where end_at is not null
group by site_id, cell_id;
