-- Oldest code served: 0000_ledger
CREATE TABLE "sealed_boxes" (
	"site_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"kiosk_id" uuid NOT NULL,
	"worker_number" text NOT NULL,
	"sealed" text NOT NULL,
	"kept_at" timestamp (3) with time zone NOT NULL,
	CONSTRAINT "sealed_boxes_site_id_id_pk" PRIMARY KEY("site_id","id")
);
--> statement-breakpoint
ALTER TABLE "sealed_boxes" ADD CONSTRAINT "sealed_boxes_site_id_kiosk_id_kiosks_site_id_id_fk" FOREIGN KEY ("site_id","kiosk_id") REFERENCES "public"."kiosks"("site_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
CREATE INDEX "sealed_boxes_site_id_kiosk_id_index" ON "sealed_boxes" USING btree ("site_id","kiosk_id");--> statement-breakpoint
CREATE INDEX "planned_shifts_site_id_start_at_index" ON "planned_shifts" USING btree ("site_id","start_at");