-- Oldest code served: 0000_ledger
CREATE TABLE "account_roles" (
	"site_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"account_id" uuid NOT NULL,
	"role" text NOT NULL,
	"cell_id" uuid,
	"created_at" timestamp (3) with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "account_roles_site_id_id_pk" PRIMARY KEY("site_id","id"),
	CONSTRAINT "account_roles_siteId_accountId_role_cellId_unique" UNIQUE NULLS NOT DISTINCT("site_id","account_id","role","cell_id"),
	CONSTRAINT "account_roles_role" CHECK ("account_roles"."role" in ('admin', 'planner', 'lead', 'inspector', 'payroll', 'worker')),
	CONSTRAINT "account_roles_cell" CHECK (("account_roles"."role" = 'lead') = ("account_roles"."cell_id" is not null))
);
--> statement-breakpoint
CREATE TABLE "account_workers" (
	"site_id" uuid NOT NULL,
	"account_id" uuid NOT NULL,
	"worker_id" uuid NOT NULL,
	CONSTRAINT "account_workers_site_id_account_id_pk" PRIMARY KEY("site_id","account_id"),
	CONSTRAINT "account_workers_siteId_workerId_unique" UNIQUE("site_id","worker_id")
);
--> statement-breakpoint
CREATE TABLE "accounts" (
	"id" uuid PRIMARY KEY NOT NULL,
	"email" text NOT NULL,
	"name" text NOT NULL,
	"password_hash" text NOT NULL,
	"disabled_at" timestamp (3) with time zone,
	"created_at" timestamp (3) with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "accounts_email_unique" UNIQUE("email")
);
--> statement-breakpoint
CREATE TABLE "api_keys" (
	"id" uuid PRIMARY KEY NOT NULL,
	"site_id" uuid NOT NULL,
	"role" text NOT NULL,
	"name" text NOT NULL,
	"key_hash" text NOT NULL,
	"created_at" timestamp (3) with time zone DEFAULT now() NOT NULL,
	"last_used_at" timestamp (3) with time zone,
	"revoked_at" timestamp (3) with time zone,
	CONSTRAINT "api_keys_keyHash_unique" UNIQUE("key_hash"),
	CONSTRAINT "api_keys_role" CHECK ("api_keys"."role" in ('admin', 'planner', 'lead', 'inspector', 'payroll', 'worker'))
);
--> statement-breakpoint
CREATE TABLE "office_sessions" (
	"id" uuid PRIMARY KEY NOT NULL,
	"account_id" uuid NOT NULL,
	"created_at" timestamp (3) with time zone DEFAULT now() NOT NULL,
	"last_seen_at" timestamp (3) with time zone DEFAULT now() NOT NULL,
	"expires_at" timestamp (3) with time zone NOT NULL,
	"revoked_at" timestamp (3) with time zone
);
--> statement-breakpoint
CREATE TABLE "setup_links" (
	"id" uuid PRIMARY KEY NOT NULL,
	"token_hash" text NOT NULL,
	"expires_at" timestamp (3) with time zone NOT NULL,
	"used_at" timestamp (3) with time zone,
	CONSTRAINT "setup_links_tokenHash_unique" UNIQUE("token_hash")
);
--> statement-breakpoint
CREATE TABLE "throttles" (
	"key" text PRIMARY KEY NOT NULL,
	"failures" integer DEFAULT 0 NOT NULL,
	"blocked_until" timestamp (3) with time zone,
	"last_failed_at" timestamp (3) with time zone NOT NULL
);
--> statement-breakpoint
CREATE TABLE "audit_log" (
	"site_id" uuid NOT NULL,
	"seq" bigint GENERATED ALWAYS AS IDENTITY (sequence name "audit_log_seq_seq" INCREMENT BY 1 MINVALUE 1 MAXVALUE 9223372036854775807 START WITH 1 CACHE 1),
	"at" timestamp (3) with time zone DEFAULT now() NOT NULL,
	"actor" text NOT NULL,
	"action" text NOT NULL,
	"subject" text NOT NULL,
	"detail" jsonb,
	"request_id" uuid,
	CONSTRAINT "audit_log_site_id_seq_pk" PRIMARY KEY("site_id","seq")
);
--> statement-breakpoint
CREATE TABLE "cells" (
	"site_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"name" text NOT NULL,
	"position" integer NOT NULL,
	CONSTRAINT "cells_site_id_id_pk" PRIMARY KEY("site_id","id"),
	CONSTRAINT "cells_siteId_name_unique" UNIQUE("site_id","name")
);
--> statement-breakpoint
CREATE TABLE "dirty_marks" (
	"site_id" uuid NOT NULL,
	"id" bigint GENERATED ALWAYS AS IDENTITY (sequence name "dirty_marks_id_seq" INCREMENT BY 1 MINVALUE 1 MAXVALUE 9223372036854775807 START WITH 1 CACHE 1),
	"kind" text NOT NULL,
	"key" text NOT NULL,
	"marked_at" timestamp (3) with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "dirty_marks_site_id_id_pk" PRIMARY KEY("site_id","id")
);
--> statement-breakpoint
CREATE TABLE "enrolment_codes" (
	"site_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"code_hash" text NOT NULL,
	"name" text NOT NULL,
	"cell_id" uuid NOT NULL,
	"expires_at" timestamp (3) with time zone NOT NULL,
	"used_at" timestamp (3) with time zone,
	CONSTRAINT "enrolment_codes_site_id_id_pk" PRIMARY KEY("site_id","id"),
	CONSTRAINT "enrolment_codes_codeHash_unique" UNIQUE("code_hash")
);
--> statement-breakpoint
CREATE TABLE "kiosk_cells" (
	"site_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"kiosk_id" uuid NOT NULL,
	"cell_id" uuid NOT NULL,
	"position" integer DEFAULT 0 NOT NULL,
	"effective_from" timestamp (3) with time zone NOT NULL,
	CONSTRAINT "kiosk_cells_site_id_id_pk" PRIMARY KEY("site_id","id")
);
--> statement-breakpoint
CREATE TABLE "kiosk_sessions" (
	"site_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"kiosk_id" uuid NOT NULL,
	"worker_id" uuid NOT NULL,
	"token_hash" text,
	"sealed_hash" text,
	"opened_at" timestamp (3) with time zone NOT NULL,
	"ended_at" timestamp (3) with time zone,
	CONSTRAINT "kiosk_sessions_site_id_id_pk" PRIMARY KEY("site_id","id"),
	CONSTRAINT "kiosk_sessions_tokenHash_unique" UNIQUE("token_hash")
);
--> statement-breakpoint
CREATE TABLE "kiosks" (
	"site_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"name" text NOT NULL,
	"token_hash" text NOT NULL,
	"enrolled_at" timestamp (3) with time zone DEFAULT now() NOT NULL,
	"last_seen_at" timestamp (3) with time zone,
	"revoked_at" timestamp (3) with time zone,
	"build" text,
	"queued" integer,
	"battery_percent" integer,
	"seal_kid" text,
	CONSTRAINT "kiosks_site_id_id_pk" PRIMARY KEY("site_id","id"),
	CONSTRAINT "kiosks_tokenHash_unique" UNIQUE("token_hash")
);
--> statement-breakpoint
CREATE TABLE "seal_keys" (
	"site_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"kid" text NOT NULL,
	"public_key" text NOT NULL,
	"private_key" text NOT NULL,
	"created_at" timestamp (3) with time zone DEFAULT now() NOT NULL,
	"retired_at" timestamp (3) with time zone,
	CONSTRAINT "seal_keys_site_id_id_pk" PRIMARY KEY("site_id","id"),
	CONSTRAINT "seal_keys_siteId_kid_unique" UNIQUE("site_id","kid")
);
--> statement-breakpoint
CREATE TABLE "clock_events" (
	"site_id" uuid NOT NULL,
	"received_at" timestamp (3) with time zone NOT NULL,
	"id" uuid NOT NULL,
	"kind" text NOT NULL,
	"worker_id" uuid,
	"worker_number" text,
	"kiosk_id" uuid,
	"session_id" uuid,
	"by" text,
	"raw_at" timestamp (3) with time zone,
	"at" timestamp (3) with time zone,
	"target_id" uuid,
	"counts_at" timestamp (3) with time zone,
	"uncertainty_ms" integer,
	"seq" bigint,
	"cell_id" uuid,
	"weights" integer[],
	"kept_for" text,
	"questions" text[],
	"body" jsonb NOT NULL,
	"body_hash" text NOT NULL,
	CONSTRAINT "clock_events_site_id_received_at_id_pk" PRIMARY KEY("site_id","received_at","id")
) PARTITION BY RANGE ("received_at");
--> statement-breakpoint
CREATE TABLE "event_ids" (
	"site_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"received_at" timestamp (3) with time zone NOT NULL,
	"body_hash" text NOT NULL,
	CONSTRAINT "event_ids_site_id_id_pk" PRIMARY KEY("site_id","id")
);
--> statement-breakpoint
CREATE TABLE "notes" (
	"site_id" uuid NOT NULL,
	"event_id" uuid NOT NULL,
	"text" text,
	"erased_at" timestamp (3) with time zone,
	CONSTRAINT "notes_site_id_event_id_pk" PRIMARY KEY("site_id","event_id")
);
--> statement-breakpoint
CREATE TABLE "orders" (
	"site_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"number" text NOT NULL,
	"due_on" date,
	"created_at" timestamp (3) with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "orders_site_id_id_pk" PRIMARY KEY("site_id","id"),
	CONSTRAINT "orders_siteId_number_unique" UNIQUE("site_id","number")
);
--> statement-breakpoint
CREATE TABLE "planned_shifts" (
	"site_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"seq" integer GENERATED ALWAYS AS IDENTITY (sequence name "planned_shifts_seq_seq" INCREMENT BY 1 MINVALUE 1 MAXVALUE 2147483647 START WITH 1 CACHE 1),
	"worker_id" uuid NOT NULL,
	"work_on" date NOT NULL,
	"start_at" timestamp (3) with time zone NOT NULL,
	"end_at" timestamp (3) with time zone NOT NULL,
	CONSTRAINT "planned_shifts_site_id_id_pk" PRIMARY KEY("site_id","id"),
	CONSTRAINT "planned_shifts_order" CHECK ("planned_shifts"."end_at" > "planned_shifts"."start_at")
);
--> statement-breakpoint
CREATE TABLE "workers" (
	"site_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"number" text NOT NULL,
	"name" text NOT NULL,
	"language" text DEFAULT 'en' NOT NULL,
	"home_cell_id" uuid NOT NULL,
	"payroll_number" text,
	"pin_hash" text,
	"pin_set_at" timestamp (3) with time zone,
	"ends_on" date,
	"created_at" timestamp (3) with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "workers_site_id_id_pk" PRIMARY KEY("site_id","id"),
	CONSTRAINT "workers_payrollNumber_unique" UNIQUE("payroll_number"),
	CONSTRAINT "workers_siteId_number_unique" UNIQUE("site_id","number"),
	CONSTRAINT "workers_number_digits" CHECK ("workers"."number" ~ '^[0-9]{1,8}$')
);
--> statement-breakpoint
CREATE TABLE "site_rules" (
	"site_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"effective_from" timestamp (3) with time zone NOT NULL,
	"time_zone" text NOT NULL,
	"production_day_starts_at_minutes" integer DEFAULT 0 NOT NULL,
	"shift_limit_seconds" integer NOT NULL,
	"since_limit_seconds" integer NOT NULL,
	"rest_max_seconds" integer NOT NULL,
	"meal_max_seconds" integer NOT NULL,
	"rest_between_shifts_seconds" integer NOT NULL,
	CONSTRAINT "site_rules_site_id_id_pk" PRIMARY KEY("site_id","id"),
	CONSTRAINT "site_rules_day_starts" CHECK ("site_rules"."production_day_starts_at_minutes" between 0 and 1439)
);
--> statement-breakpoint
CREATE TABLE "sites" (
	"id" uuid PRIMARY KEY NOT NULL,
	"name" text NOT NULL,
	"locale" text DEFAULT 'en' NOT NULL,
	"created_at" timestamp (3) with time zone DEFAULT now() NOT NULL
);
--> statement-breakpoint
CREATE TABLE "models" (
	"site_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"name" text NOT NULL,
	"kind" text NOT NULL,
	"created_at" timestamp (3) with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "models_site_id_id_pk" PRIMARY KEY("site_id","id"),
	CONSTRAINT "models_siteId_name_unique" UNIQUE("site_id","name")
);
--> statement-breakpoint
CREATE TABLE "operations" (
	"site_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"code" text NOT NULL,
	"name" text NOT NULL,
	"stage" text NOT NULL,
	"cell_id" uuid NOT NULL,
	"share_by" text DEFAULT 'standard' NOT NULL,
	"hazards" text[] DEFAULT '{}'::text[] NOT NULL,
	CONSTRAINT "operations_site_id_id_pk" PRIMARY KEY("site_id","id"),
	CONSTRAINT "operations_siteId_code_unique" UNIQUE("site_id","code"),
	CONSTRAINT "operations_share_by" CHECK ("operations"."share_by" in ('standard', 'equal'))
);
--> statement-breakpoint
CREATE TABLE "options" (
	"site_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"model_id" uuid NOT NULL,
	"name" text NOT NULL,
	CONSTRAINT "options_site_id_id_pk" PRIMARY KEY("site_id","id"),
	CONSTRAINT "options_siteId_modelId_name_unique" UNIQUE("site_id","model_id","name")
);
--> statement-breakpoint
CREATE TABLE "routing_operations" (
	"site_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"routing_id" uuid NOT NULL,
	"operation_id" uuid NOT NULL,
	"position" integer NOT NULL,
	CONSTRAINT "routing_operations_site_id_id_pk" PRIMARY KEY("site_id","id"),
	CONSTRAINT "routing_operations_siteId_routingId_position_unique" UNIQUE("site_id","routing_id","position")
);
--> statement-breakpoint
CREATE TABLE "routings" (
	"site_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"model_id" uuid NOT NULL,
	"revision" integer NOT NULL,
	"created_at" timestamp (3) with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "routings_site_id_id_pk" PRIMARY KEY("site_id","id"),
	CONSTRAINT "routings_siteId_modelId_revision_unique" UNIQUE("site_id","model_id","revision")
);
--> statement-breakpoint
CREATE TABLE "standards" (
	"site_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"seq" integer GENERATED ALWAYS AS IDENTITY (sequence name "standards_seq_seq" INCREMENT BY 1 MINVALUE 1 MAXVALUE 2147483647 START WITH 1 CACHE 1),
	"model_id" uuid NOT NULL,
	"operation_id" uuid NOT NULL,
	"option_id" uuid,
	"setup_seconds" integer NOT NULL,
	"run_seconds" integer NOT NULL,
	"effective_from" date NOT NULL,
	"entered_by" text NOT NULL,
	"reason" text NOT NULL,
	"created_at" timestamp (3) with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "standards_site_id_id_pk" PRIMARY KEY("site_id","id"),
	CONSTRAINT "standards_seconds" CHECK ("standards"."setup_seconds" >= 0 and "standards"."run_seconds" >= 0)
);
--> statement-breakpoint
CREATE TABLE "ticket_operations" (
	"site_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"ticket_id" uuid NOT NULL,
	"operation_id" uuid NOT NULL,
	"position" integer NOT NULL,
	"state" text DEFAULT 'waiting' NOT NULL,
	"good" integer DEFAULT 0 NOT NULL,
	"rework" integer DEFAULT 0 NOT NULL,
	"scrap" integer DEFAULT 0 NOT NULL,
	"open_quantity" integer NOT NULL,
	"actual_seconds" integer DEFAULT 0 NOT NULL,
	"first_work_at" timestamp (3) with time zone,
	"finished_at" timestamp (3) with time zone,
	CONSTRAINT "ticket_operations_site_id_id_pk" PRIMARY KEY("site_id","id"),
	CONSTRAINT "ticket_operations_siteId_ticketId_position_unique" UNIQUE("site_id","ticket_id","position"),
	CONSTRAINT "ticket_operations_siteId_ticketId_operationId_unique" UNIQUE("site_id","ticket_id","operation_id"),
	CONSTRAINT "ticket_operations_state" CHECK ("ticket_operations"."state" in ('waiting', 'ready', 'working', 'finished', 'closed'))
);
--> statement-breakpoint
CREATE TABLE "ticket_options" (
	"site_id" uuid NOT NULL,
	"ticket_id" uuid NOT NULL,
	"option_id" uuid NOT NULL,
	CONSTRAINT "ticket_options_site_id_ticket_id_option_id_pk" PRIMARY KEY("site_id","ticket_id","option_id")
);
--> statement-breakpoint
CREATE TABLE "tickets" (
	"site_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"seq" bigint GENERATED ALWAYS AS IDENTITY (sequence name "tickets_seq_seq" INCREMENT BY 1 MINVALUE 1 MAXVALUE 9223372036854775807 START WITH 1 CACHE 1),
	"number" text NOT NULL,
	"model_id" uuid NOT NULL,
	"order_id" uuid,
	"quantity" integer NOT NULL,
	"due_on" date,
	"status" text DEFAULT 'open' NOT NULL,
	"created_at" timestamp (3) with time zone DEFAULT now() NOT NULL,
	"finished_at" timestamp (3) with time zone,
	CONSTRAINT "tickets_site_id_id_pk" PRIMARY KEY("site_id","id"),
	CONSTRAINT "tickets_siteId_number_unique" UNIQUE("site_id","number"),
	CONSTRAINT "tickets_siteId_seq_unique" UNIQUE("site_id","seq"),
	CONSTRAINT "tickets_quantity" CHECK ("tickets"."quantity" > 0),
	CONSTRAINT "tickets_status" CHECK ("tickets"."status" in ('open', 'finished', 'scrapped', 'cancelled'))
);
--> statement-breakpoint
CREATE TABLE "loose_ends" (
	"site_id" uuid NOT NULL,
	"code" text NOT NULL,
	"subject" text NOT NULL,
	"source" text NOT NULL,
	"worker_id" uuid,
	"kiosk_id" uuid,
	"ticket" text,
	"at" timestamp (3) with time zone NOT NULL,
	"settled" boolean DEFAULT false NOT NULL,
	CONSTRAINT "loose_ends_site_id_code_subject_pk" PRIMARY KEY("site_id","code","subject")
);
--> statement-breakpoint
CREATE TABLE "reports" (
	"site_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"kind" text NOT NULL,
	"worker_id" uuid NOT NULL,
	"at" timestamp (3) with time zone NOT NULL,
	"ticket" text NOT NULL,
	"operation" text NOT NULL,
	"good" integer NOT NULL,
	"rework" integer NOT NULL,
	"scrap" integer NOT NULL,
	"stop" boolean NOT NULL,
	"caused_by" text,
	"defects" text[] DEFAULT '{}'::text[] NOT NULL,
	"cell_id" uuid,
	CONSTRAINT "reports_site_id_id_pk" PRIMARY KEY("site_id","id")
);
--> statement-breakpoint
CREATE TABLE "segments" (
	"site_id" uuid NOT NULL,
	"start_at" timestamp (3) with time zone NOT NULL,
	"worker_id" uuid NOT NULL,
	"item" smallint NOT NULL,
	"end_at" timestamp (3) with time zone,
	"activity" text NOT NULL,
	"ticket" text,
	"operation" text,
	"code" text,
	"weight" integer,
	"seconds" integer,
	"cell_id" uuid,
	"said" boolean DEFAULT false NOT NULL,
	"event_id" uuid NOT NULL,
	CONSTRAINT "segments_site_id_start_at_worker_id_item_pk" PRIMARY KEY("site_id","start_at","worker_id","item"),
	CONSTRAINT "segments_order" CHECK ("segments"."end_at" > "segments"."start_at")
) PARTITION BY RANGE ("start_at");
--> statement-breakpoint
CREATE TABLE "shifts" (
	"site_id" uuid NOT NULL,
	"worker_id" uuid NOT NULL,
	"start_at" timestamp (3) with time zone NOT NULL,
	"end_at" timestamp (3) with time zone,
	"start_event_id" uuid NOT NULL,
	"end_event_id" uuid,
	"provisional" boolean DEFAULT false NOT NULL,
	"cell_id" uuid,
	CONSTRAINT "shifts_site_id_worker_id_start_at_pk" PRIMARY KEY("site_id","worker_id","start_at")
);
--> statement-breakpoint
CREATE TABLE "timeline_heads" (
	"site_id" uuid NOT NULL,
	"worker_id" uuid NOT NULL,
	"version" integer DEFAULT 0 NOT NULL,
	"as_of" timestamp (3) with time zone NOT NULL,
	CONSTRAINT "timeline_heads_site_id_worker_id_pk" PRIMARY KEY("site_id","worker_id")
);
--> statement-breakpoint
ALTER TABLE "account_roles" ADD CONSTRAINT "account_roles_site_id_sites_id_fk" FOREIGN KEY ("site_id") REFERENCES "public"."sites"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "account_roles" ADD CONSTRAINT "account_roles_account_id_accounts_id_fk" FOREIGN KEY ("account_id") REFERENCES "public"."accounts"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "account_roles" ADD CONSTRAINT "account_roles_site_id_cell_id_cells_site_id_id_fk" FOREIGN KEY ("site_id","cell_id") REFERENCES "public"."cells"("site_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "account_workers" ADD CONSTRAINT "account_workers_account_id_accounts_id_fk" FOREIGN KEY ("account_id") REFERENCES "public"."accounts"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "account_workers" ADD CONSTRAINT "account_workers_site_id_worker_id_workers_site_id_id_fk" FOREIGN KEY ("site_id","worker_id") REFERENCES "public"."workers"("site_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "api_keys" ADD CONSTRAINT "api_keys_site_id_sites_id_fk" FOREIGN KEY ("site_id") REFERENCES "public"."sites"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "office_sessions" ADD CONSTRAINT "office_sessions_account_id_accounts_id_fk" FOREIGN KEY ("account_id") REFERENCES "public"."accounts"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "cells" ADD CONSTRAINT "cells_site_id_sites_id_fk" FOREIGN KEY ("site_id") REFERENCES "public"."sites"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "enrolment_codes" ADD CONSTRAINT "enrolment_codes_site_id_cell_id_cells_site_id_id_fk" FOREIGN KEY ("site_id","cell_id") REFERENCES "public"."cells"("site_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "kiosk_cells" ADD CONSTRAINT "kiosk_cells_site_id_kiosk_id_kiosks_site_id_id_fk" FOREIGN KEY ("site_id","kiosk_id") REFERENCES "public"."kiosks"("site_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "kiosk_cells" ADD CONSTRAINT "kiosk_cells_site_id_cell_id_cells_site_id_id_fk" FOREIGN KEY ("site_id","cell_id") REFERENCES "public"."cells"("site_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "kiosk_sessions" ADD CONSTRAINT "kiosk_sessions_site_id_kiosk_id_kiosks_site_id_id_fk" FOREIGN KEY ("site_id","kiosk_id") REFERENCES "public"."kiosks"("site_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "kiosk_sessions" ADD CONSTRAINT "kiosk_sessions_site_id_worker_id_workers_site_id_id_fk" FOREIGN KEY ("site_id","worker_id") REFERENCES "public"."workers"("site_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "kiosks" ADD CONSTRAINT "kiosks_site_id_sites_id_fk" FOREIGN KEY ("site_id") REFERENCES "public"."sites"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "seal_keys" ADD CONSTRAINT "seal_keys_site_id_sites_id_fk" FOREIGN KEY ("site_id") REFERENCES "public"."sites"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "orders" ADD CONSTRAINT "orders_site_id_sites_id_fk" FOREIGN KEY ("site_id") REFERENCES "public"."sites"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "planned_shifts" ADD CONSTRAINT "planned_shifts_site_id_worker_id_workers_site_id_id_fk" FOREIGN KEY ("site_id","worker_id") REFERENCES "public"."workers"("site_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "workers" ADD CONSTRAINT "workers_site_id_sites_id_fk" FOREIGN KEY ("site_id") REFERENCES "public"."sites"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "workers" ADD CONSTRAINT "workers_site_id_home_cell_id_cells_site_id_id_fk" FOREIGN KEY ("site_id","home_cell_id") REFERENCES "public"."cells"("site_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "site_rules" ADD CONSTRAINT "site_rules_site_id_sites_id_fk" FOREIGN KEY ("site_id") REFERENCES "public"."sites"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "models" ADD CONSTRAINT "models_site_id_sites_id_fk" FOREIGN KEY ("site_id") REFERENCES "public"."sites"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "operations" ADD CONSTRAINT "operations_site_id_sites_id_fk" FOREIGN KEY ("site_id") REFERENCES "public"."sites"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "operations" ADD CONSTRAINT "operations_site_id_cell_id_cells_site_id_id_fk" FOREIGN KEY ("site_id","cell_id") REFERENCES "public"."cells"("site_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "options" ADD CONSTRAINT "options_site_id_model_id_models_site_id_id_fk" FOREIGN KEY ("site_id","model_id") REFERENCES "public"."models"("site_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "routing_operations" ADD CONSTRAINT "routing_operations_site_id_routing_id_routings_site_id_id_fk" FOREIGN KEY ("site_id","routing_id") REFERENCES "public"."routings"("site_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "routing_operations" ADD CONSTRAINT "routing_operations_site_id_operation_id_operations_site_id_id_fk" FOREIGN KEY ("site_id","operation_id") REFERENCES "public"."operations"("site_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "routings" ADD CONSTRAINT "routings_site_id_model_id_models_site_id_id_fk" FOREIGN KEY ("site_id","model_id") REFERENCES "public"."models"("site_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "standards" ADD CONSTRAINT "standards_site_id_model_id_models_site_id_id_fk" FOREIGN KEY ("site_id","model_id") REFERENCES "public"."models"("site_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "standards" ADD CONSTRAINT "standards_site_id_operation_id_operations_site_id_id_fk" FOREIGN KEY ("site_id","operation_id") REFERENCES "public"."operations"("site_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "standards" ADD CONSTRAINT "standards_site_id_option_id_options_site_id_id_fk" FOREIGN KEY ("site_id","option_id") REFERENCES "public"."options"("site_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "ticket_operations" ADD CONSTRAINT "ticket_operations_site_id_ticket_id_tickets_site_id_id_fk" FOREIGN KEY ("site_id","ticket_id") REFERENCES "public"."tickets"("site_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "ticket_operations" ADD CONSTRAINT "ticket_operations_site_id_operation_id_operations_site_id_id_fk" FOREIGN KEY ("site_id","operation_id") REFERENCES "public"."operations"("site_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "ticket_options" ADD CONSTRAINT "ticket_options_site_id_ticket_id_tickets_site_id_id_fk" FOREIGN KEY ("site_id","ticket_id") REFERENCES "public"."tickets"("site_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "ticket_options" ADD CONSTRAINT "ticket_options_site_id_option_id_options_site_id_id_fk" FOREIGN KEY ("site_id","option_id") REFERENCES "public"."options"("site_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "tickets" ADD CONSTRAINT "tickets_site_id_sites_id_fk" FOREIGN KEY ("site_id") REFERENCES "public"."sites"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "tickets" ADD CONSTRAINT "tickets_site_id_model_id_models_site_id_id_fk" FOREIGN KEY ("site_id","model_id") REFERENCES "public"."models"("site_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "tickets" ADD CONSTRAINT "tickets_site_id_order_id_orders_site_id_id_fk" FOREIGN KEY ("site_id","order_id") REFERENCES "public"."orders"("site_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "loose_ends" ADD CONSTRAINT "loose_ends_site_id_worker_id_workers_site_id_id_fk" FOREIGN KEY ("site_id","worker_id") REFERENCES "public"."workers"("site_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "reports" ADD CONSTRAINT "reports_site_id_worker_id_workers_site_id_id_fk" FOREIGN KEY ("site_id","worker_id") REFERENCES "public"."workers"("site_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "segments" ADD CONSTRAINT "segments_site_id_worker_id_workers_site_id_id_fk" FOREIGN KEY ("site_id","worker_id") REFERENCES "public"."workers"("site_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "shifts" ADD CONSTRAINT "shifts_site_id_worker_id_workers_site_id_id_fk" FOREIGN KEY ("site_id","worker_id") REFERENCES "public"."workers"("site_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "timeline_heads" ADD CONSTRAINT "timeline_heads_site_id_worker_id_workers_site_id_id_fk" FOREIGN KEY ("site_id","worker_id") REFERENCES "public"."workers"("site_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
CREATE INDEX "account_roles_account_id_index" ON "account_roles" USING btree ("account_id");--> statement-breakpoint
CREATE INDEX "account_roles_site_id_cell_id_index" ON "account_roles" USING btree ("site_id","cell_id");--> statement-breakpoint
CREATE INDEX "account_workers_account_id_index" ON "account_workers" USING btree ("account_id");--> statement-breakpoint
CREATE INDEX "api_keys_site_id_index" ON "api_keys" USING btree ("site_id");--> statement-breakpoint
CREATE INDEX "office_sessions_account_id_index" ON "office_sessions" USING btree ("account_id");--> statement-breakpoint
CREATE INDEX "audit_log_site_id_subject_index" ON "audit_log" USING btree ("site_id","subject");--> statement-breakpoint
CREATE INDEX "dirty_marks_kind_id_index" ON "dirty_marks" USING btree ("kind","id");--> statement-breakpoint
CREATE INDEX "enrolment_codes_site_id_cell_id_index" ON "enrolment_codes" USING btree ("site_id","cell_id");--> statement-breakpoint
CREATE INDEX "kiosk_cells_site_id_kiosk_id_effective_from_index" ON "kiosk_cells" USING btree ("site_id","kiosk_id","effective_from");--> statement-breakpoint
CREATE INDEX "kiosk_cells_site_id_cell_id_index" ON "kiosk_cells" USING btree ("site_id","cell_id");--> statement-breakpoint
CREATE INDEX "kiosk_sessions_site_id_kiosk_id_index" ON "kiosk_sessions" USING btree ("site_id","kiosk_id");--> statement-breakpoint
CREATE INDEX "kiosk_sessions_site_id_worker_id_opened_at_index" ON "kiosk_sessions" USING btree ("site_id","worker_id","opened_at");--> statement-breakpoint
CREATE INDEX "clock_events_worker" ON "clock_events" USING btree ("site_id","worker_id","at");--> statement-breakpoint
CREATE INDEX "clock_events_id" ON "clock_events" USING btree ("site_id","id");--> statement-breakpoint
CREATE INDEX "clock_events_corrections" ON "clock_events" USING btree ("site_id","worker_id") WHERE kind in ('void', 'move', 'insert', 'reassign', 'settle');--> statement-breakpoint
CREATE INDEX "planned_shifts_site_id_worker_id_start_at_index" ON "planned_shifts" USING btree ("site_id","worker_id","start_at");--> statement-breakpoint
CREATE INDEX "workers_site_id_home_cell_id_index" ON "workers" USING btree ("site_id","home_cell_id");--> statement-breakpoint
CREATE INDEX "operations_site_id_cell_id_index" ON "operations" USING btree ("site_id","cell_id");--> statement-breakpoint
CREATE INDEX "routing_operations_site_id_operation_id_index" ON "routing_operations" USING btree ("site_id","operation_id");--> statement-breakpoint
CREATE INDEX "standards_site_id_model_id_operation_id_effective_from_index" ON "standards" USING btree ("site_id","model_id","operation_id","effective_from");--> statement-breakpoint
CREATE INDEX "standards_site_id_operation_id_index" ON "standards" USING btree ("site_id","operation_id");--> statement-breakpoint
CREATE INDEX "standards_site_id_option_id_index" ON "standards" USING btree ("site_id","option_id");--> statement-breakpoint
CREATE INDEX "ticket_operations_site_id_operation_id_state_index" ON "ticket_operations" USING btree ("site_id","operation_id","state");--> statement-breakpoint
CREATE INDEX "ticket_options_site_id_option_id_index" ON "ticket_options" USING btree ("site_id","option_id");--> statement-breakpoint
CREATE INDEX "tickets_site_id_status_seq_index" ON "tickets" USING btree ("site_id","status","seq");--> statement-breakpoint
CREATE INDEX "tickets_site_id_model_id_index" ON "tickets" USING btree ("site_id","model_id");--> statement-breakpoint
CREATE INDEX "tickets_site_id_order_id_index" ON "tickets" USING btree ("site_id","order_id");--> statement-breakpoint
CREATE INDEX "loose_ends_site_id_worker_id_at_index" ON "loose_ends" USING btree ("site_id","worker_id","at");--> statement-breakpoint
CREATE INDEX "loose_ends_site_id_settled_at_index" ON "loose_ends" USING btree ("site_id","settled","at");--> statement-breakpoint
CREATE INDEX "loose_ends_site_id_ticket_index" ON "loose_ends" USING btree ("site_id","ticket");--> statement-breakpoint
CREATE INDEX "reports_site_id_ticket_operation_index" ON "reports" USING btree ("site_id","ticket","operation");--> statement-breakpoint
CREATE INDEX "reports_site_id_worker_id_at_index" ON "reports" USING btree ("site_id","worker_id","at");--> statement-breakpoint
CREATE INDEX "segments_worker" ON "segments" USING btree ("site_id","worker_id","start_at");--> statement-breakpoint
CREATE INDEX "segments_ticket" ON "segments" USING btree ("site_id","ticket","operation");--> statement-breakpoint
CREATE INDEX "segments_open" ON "segments" USING btree ("site_id","worker_id") WHERE end_at is null;--> statement-breakpoint
CREATE INDEX "shifts_start" ON "shifts" USING btree ("site_id","start_at");--> statement-breakpoint
CREATE INDEX "shifts_open" ON "shifts" USING btree ("site_id","worker_id") WHERE end_at is null;