-- Oldest code served: 0000_ledger
ALTER TABLE "pay_revisions" ADD COLUMN "starts_at" timestamp (3) with time zone NOT NULL;--> statement-breakpoint
ALTER TABLE "pay_revisions" ADD COLUMN "ends_at" timestamp (3) with time zone NOT NULL;