ALTER TABLE "measurements" DROP CONSTRAINT "measurements_once";--> statement-breakpoint
ALTER TABLE "measurements" ADD COLUMN "origin_version_id" uuid;--> statement-breakpoint
ALTER TABLE "measurements" ADD CONSTRAINT "measurements_origin_version_id_mark_versions_id_fk" FOREIGN KEY ("origin_version_id") REFERENCES "public"."mark_versions"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "measurements" ADD CONSTRAINT "measurements_once" UNIQUE NULLS NOT DISTINCT("mark_version_id","binding_id","quantity","origin_version_id");