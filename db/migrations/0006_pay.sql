-- Oldest code served: 0000_ledger
-- Pay policies, periods, what closing them froze, and the files of it.

CREATE TABLE "pay_cards" (
	"site_id" uuid NOT NULL,
	"period_id" uuid NOT NULL,
	"revision" integer NOT NULL,
	"worker_id" uuid NOT NULL,
	"number" text NOT NULL,
	"name" text NOT NULL,
	"cell" text NOT NULL,
	"payroll_number" text,
	"reason" text,
	"open_ends" integer NOT NULL,
	"signed_by_worker" boolean NOT NULL,
	"signed_by_lead" boolean NOT NULL,
	CONSTRAINT "pay_cards_site_id_period_id_revision_worker_id_pk" PRIMARY KEY("site_id","period_id","revision","worker_id")
);
--> statement-breakpoint
CREATE TABLE "pay_choices" (
	"site_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"seq" integer GENERATED ALWAYS AS IDENTITY (sequence name "pay_choices_seq_seq" INCREMENT BY 1 MINVALUE 1 MAXVALUE 2147483647 START WITH 1 CACHE 1),
	"worker_id" uuid,
	"policy" text,
	"effective_on" date NOT NULL,
	"entered_by" text NOT NULL,
	"reason" text NOT NULL,
	"entered_at" timestamp (3) with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "pay_choices_site_id_id_pk" PRIMARY KEY("site_id","id"),
	CONSTRAINT "pay_choices_site" CHECK ("pay_choices"."worker_id" is not null or "pay_choices"."policy" is not null)
);
--> statement-breakpoint
CREATE TABLE "pay_exports" (
	"site_id" uuid NOT NULL,
	"period_id" uuid NOT NULL,
	"revision" integer NOT NULL,
	"layout" integer NOT NULL,
	"format" text NOT NULL,
	"bytes" "bytea",
	"digest" text NOT NULL,
	"totals" jsonb NOT NULL,
	"made_by" text NOT NULL,
	"made_at" timestamp (3) with time zone NOT NULL,
	"erased_at" timestamp (3) with time zone,
	CONSTRAINT "pay_exports_site_id_period_id_revision_layout_format_pk" PRIMARY KEY("site_id","period_id","revision","layout","format"),
	CONSTRAINT "pay_exports_bytes" CHECK (("pay_exports"."bytes" is null) = ("pay_exports"."erased_at" is not null))
);
--> statement-breakpoint
CREATE TABLE "pay_periods" (
	"site_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"from_on" date NOT NULL,
	"to_on" date NOT NULL,
	CONSTRAINT "pay_periods_site_id_id_pk" PRIMARY KEY("site_id","id"),
	CONSTRAINT "pay_periods_from" UNIQUE("site_id","from_on"),
	CONSTRAINT "pay_periods_order" CHECK ("pay_periods"."to_on" > "pay_periods"."from_on")
);
--> statement-breakpoint
CREATE TABLE "pay_policies" (
	"site_id" uuid NOT NULL,
	"name" text NOT NULL,
	"version" integer NOT NULL,
	"seq" integer GENERATED ALWAYS AS IDENTITY (sequence name "pay_policies_seq_seq" INCREMENT BY 1 MINVALUE 1 MAXVALUE 2147483647 START WITH 1 CACHE 1),
	"effective_on" date NOT NULL,
	"policy" jsonb NOT NULL,
	"entered_by" text NOT NULL,
	"reason" text NOT NULL,
	"entered_at" timestamp (3) with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "pay_policies_site_id_name_version_pk" PRIMARY KEY("site_id","name","version"),
	CONSTRAINT "pay_policies_version" CHECK ("pay_policies"."version" > 0)
);
--> statement-breakpoint
CREATE TABLE "pay_reopenings" (
	"site_id" uuid NOT NULL,
	"period_id" uuid NOT NULL,
	"revision" integer NOT NULL,
	"entered_by" text NOT NULL,
	"reason" text NOT NULL,
	"entered_at" timestamp (3) with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "pay_reopenings_site_id_period_id_revision_pk" PRIMARY KEY("site_id","period_id","revision")
);
--> statement-breakpoint
CREATE TABLE "pay_revisions" (
	"site_id" uuid NOT NULL,
	"period_id" uuid NOT NULL,
	"revision" integer NOT NULL,
	"closed_at" timestamp (3) with time zone NOT NULL,
	"closed_by" text NOT NULL,
	"closed_by_name" text NOT NULL,
	"as_of" timestamp (3) with time zone NOT NULL,
	"digest" text NOT NULL,
	"totals" jsonb NOT NULL,
	CONSTRAINT "pay_revisions_site_id_period_id_revision_pk" PRIMARY KEY("site_id","period_id","revision")
);
--> statement-breakpoint
CREATE TABLE "pay_rhythms" (
	"site_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"seq" integer GENERATED ALWAYS AS IDENTITY (sequence name "pay_rhythms_seq_seq" INCREMENT BY 1 MINVALUE 1 MAXVALUE 2147483647 START WITH 1 CACHE 1),
	"starts_on" date NOT NULL,
	"days" integer NOT NULL,
	"entered_by" text NOT NULL,
	"reason" text NOT NULL,
	"entered_at" timestamp (3) with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "pay_rhythms_site_id_id_pk" PRIMARY KEY("site_id","id"),
	CONSTRAINT "pay_rhythms_days" CHECK ("pay_rhythms"."days" between 1 and 62)
);
--> statement-breakpoint
CREATE TABLE "pay_rows" (
	"site_id" uuid NOT NULL,
	"period_id" uuid NOT NULL,
	"revision" integer NOT NULL,
	"about_id" uuid NOT NULL,
	"worker_id" uuid NOT NULL,
	"workweek_on" date NOT NULL,
	"workday_on" date NOT NULL,
	"policy" text NOT NULL,
	"worked_seconds" integer NOT NULL,
	"paid_seconds" integer NOT NULL,
	"regular_seconds" integer NOT NULL,
	"overtime_seconds" integer NOT NULL,
	"double_seconds" integer NOT NULL,
	"premiums" jsonb NOT NULL,
	"trail" jsonb NOT NULL,
	CONSTRAINT "pay_rows_site_id_period_id_revision_about_id_worker_id_workweek_on_workday_on_pk" PRIMARY KEY("site_id","period_id","revision","about_id","worker_id","workweek_on","workday_on"),
	CONSTRAINT "pay_rows_buckets" CHECK ("pay_rows"."paid_seconds" = "pay_rows"."regular_seconds" + "pay_rows"."overtime_seconds" + "pay_rows"."double_seconds")
);
--> statement-breakpoint
ALTER TABLE "pay_cards" ADD CONSTRAINT "pay_cards_site_id_period_id_revision_pay_revisions_site_id_period_id_revision_fk" FOREIGN KEY ("site_id","period_id","revision") REFERENCES "public"."pay_revisions"("site_id","period_id","revision") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "pay_cards" ADD CONSTRAINT "pay_cards_site_id_worker_id_workers_site_id_id_fk" FOREIGN KEY ("site_id","worker_id") REFERENCES "public"."workers"("site_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "pay_choices" ADD CONSTRAINT "pay_choices_site_id_sites_id_fk" FOREIGN KEY ("site_id") REFERENCES "public"."sites"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "pay_choices" ADD CONSTRAINT "pay_choices_site_id_worker_id_workers_site_id_id_fk" FOREIGN KEY ("site_id","worker_id") REFERENCES "public"."workers"("site_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "pay_exports" ADD CONSTRAINT "pay_exports_site_id_period_id_revision_pay_revisions_site_id_period_id_revision_fk" FOREIGN KEY ("site_id","period_id","revision") REFERENCES "public"."pay_revisions"("site_id","period_id","revision") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "pay_periods" ADD CONSTRAINT "pay_periods_site_id_sites_id_fk" FOREIGN KEY ("site_id") REFERENCES "public"."sites"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "pay_policies" ADD CONSTRAINT "pay_policies_site_id_sites_id_fk" FOREIGN KEY ("site_id") REFERENCES "public"."sites"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "pay_reopenings" ADD CONSTRAINT "pay_reopenings_site_id_period_id_revision_pay_revisions_site_id_period_id_revision_fk" FOREIGN KEY ("site_id","period_id","revision") REFERENCES "public"."pay_revisions"("site_id","period_id","revision") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "pay_revisions" ADD CONSTRAINT "pay_revisions_site_id_period_id_pay_periods_site_id_id_fk" FOREIGN KEY ("site_id","period_id") REFERENCES "public"."pay_periods"("site_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "pay_rhythms" ADD CONSTRAINT "pay_rhythms_site_id_sites_id_fk" FOREIGN KEY ("site_id") REFERENCES "public"."sites"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "pay_rows" ADD CONSTRAINT "pay_rows_site_id_period_id_revision_pay_revisions_site_id_period_id_revision_fk" FOREIGN KEY ("site_id","period_id","revision") REFERENCES "public"."pay_revisions"("site_id","period_id","revision") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "pay_rows" ADD CONSTRAINT "pay_rows_site_id_about_id_pay_periods_site_id_id_fk" FOREIGN KEY ("site_id","about_id") REFERENCES "public"."pay_periods"("site_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "pay_rows" ADD CONSTRAINT "pay_rows_site_id_worker_id_workers_site_id_id_fk" FOREIGN KEY ("site_id","worker_id") REFERENCES "public"."workers"("site_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
CREATE INDEX "pay_cards_site_id_worker_id_index" ON "pay_cards" USING btree ("site_id","worker_id");--> statement-breakpoint
CREATE INDEX "pay_choices_site_id_worker_id_index" ON "pay_choices" USING btree ("site_id","worker_id");--> statement-breakpoint
CREATE INDEX "pay_rows_site_id_about_id_worker_id_index" ON "pay_rows" USING btree ("site_id","about_id","worker_id");--> statement-breakpoint
CREATE INDEX "pay_rows_site_id_worker_id_index" ON "pay_rows" USING btree ("site_id","worker_id");--> statement-breakpoint
CREATE INDEX "clock_events_late" ON "clock_events" USING btree ("site_id","received_at","worker_id") WHERE received_at - at > interval '24 hours'
          or kind in ('void', 'move', 'insert', 'reassign', 'settle');
--> statement-breakpoint
create trigger pay_policies_append_only before update or delete on pay_policies
  for each row execute function refuse_change();
--> statement-breakpoint
create trigger pay_policies_no_truncate before truncate on pay_policies
  for each statement execute function refuse_change();
--> statement-breakpoint
create trigger pay_choices_append_only before update or delete on pay_choices
  for each row execute function refuse_change();
--> statement-breakpoint
create trigger pay_choices_no_truncate before truncate on pay_choices
  for each statement execute function refuse_change();
--> statement-breakpoint
create trigger pay_rhythms_append_only before update or delete on pay_rhythms
  for each row execute function refuse_change();
--> statement-breakpoint
create trigger pay_rhythms_no_truncate before truncate on pay_rhythms
  for each statement execute function refuse_change();
--> statement-breakpoint
create trigger pay_revisions_append_only before update or delete on pay_revisions
  for each row execute function refuse_change();
--> statement-breakpoint
create trigger pay_revisions_no_truncate before truncate on pay_revisions
  for each statement execute function refuse_change();
--> statement-breakpoint
create trigger pay_reopenings_append_only before update or delete on pay_reopenings
  for each row execute function refuse_change();
--> statement-breakpoint
create trigger pay_reopenings_no_truncate before truncate on pay_reopenings
  for each statement execute function refuse_change();
--> statement-breakpoint
create trigger pay_cards_append_only before update or delete on pay_cards
  for each row execute function refuse_change();
--> statement-breakpoint
create trigger pay_cards_no_truncate before truncate on pay_cards
  for each statement execute function refuse_change();
--> statement-breakpoint
create trigger pay_rows_append_only before update or delete on pay_rows
  for each row execute function refuse_change();
--> statement-breakpoint
create trigger pay_rows_no_truncate before truncate on pay_rows
  for each statement execute function refuse_change();
