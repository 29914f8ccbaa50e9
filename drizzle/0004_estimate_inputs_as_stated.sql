ALTER TABLE "estimate_inputs" ADD COLUMN "entered_uncertainty" text;--> statement-breakpoint
ALTER TABLE "estimate_inputs" ADD COLUMN "boundary" text;