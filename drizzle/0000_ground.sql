CREATE TABLE "audit_entries" (
	"id" bigint PRIMARY KEY GENERATED ALWAYS AS IDENTITY (sequence name "audit_entries_id_seq" INCREMENT BY 1 MINVALUE 1 MAXVALUE 9223372036854775807 START WITH 1 CACHE 1),
	"chain" text NOT NULL,
	"case_id" uuid,
	"act" text NOT NULL,
	"object_id" text,
	"person_id" uuid,
	"person_name" text NOT NULL,
	"at" timestamp with time zone NOT NULL,
	"before" jsonb,
	"after" jsonb,
	"reason" text,
	"previous_hash" text NOT NULL,
	"hash" text NOT NULL
);
--> statement-breakpoint
CREATE TABLE "counters" (
	"name" text PRIMARY KEY NOT NULL,
	"value" bigint NOT NULL
);
--> statement-breakpoint
CREATE TABLE "done_acts" (
	"act_id" uuid NOT NULL,
	"person_id" uuid NOT NULL,
	"at" timestamp with time zone NOT NULL,
	CONSTRAINT "done_acts_act_id_person_id_pk" PRIMARY KEY("act_id","person_id")
);
--> statement-breakpoint
CREATE TABLE "lineage" (
	"from_kind" text NOT NULL,
	"from_id" uuid NOT NULL,
	"to_kind" text NOT NULL,
	"to_id" uuid NOT NULL,
	CONSTRAINT "lineage_from_id_to_id_from_kind_to_kind_pk" PRIMARY KEY("from_id","to_id","from_kind","to_kind")
);
--> statement-breakpoint
CREATE TABLE "staleness" (
	"record_kind" text NOT NULL,
	"record_id" uuid NOT NULL,
	"cause_kind" text NOT NULL,
	"cause_id" uuid NOT NULL,
	"replaced_by_id" uuid,
	"case_id" uuid,
	"why" text NOT NULL,
	"since" timestamp with time zone NOT NULL,
	"settled_at" timestamp with time zone,
	"settled_by" uuid,
	"settlement" text,
	"reason" text,
	CONSTRAINT "staleness_record_id_cause_id_pk" PRIMARY KEY("record_id","cause_id")
);
--> statement-breakpoint
CREATE TABLE "case_authors" (
	"case_id" uuid NOT NULL,
	"person_id" uuid NOT NULL,
	"first_act" text NOT NULL,
	"at" timestamp with time zone NOT NULL,
	CONSTRAINT "case_authors_case_id_person_id_pk" PRIMARY KEY("case_id","person_id")
);
--> statement-breakpoint
CREATE TABLE "case_background" (
	"id" uuid PRIMARY KEY NOT NULL,
	"case_id" uuid NOT NULL,
	"statement" text NOT NULL,
	"standing" text NOT NULL,
	"source" text NOT NULL,
	"given_on" date NOT NULL,
	"made_by" uuid NOT NULL,
	"made_at" timestamp with time zone NOT NULL,
	"taken_back_at" timestamp with time zone,
	"version" integer DEFAULT 1 NOT NULL
);
--> statement-breakpoint
CREATE TABLE "case_people" (
	"case_id" uuid NOT NULL,
	"person_id" uuid NOT NULL,
	"added_at" timestamp with time zone NOT NULL,
	CONSTRAINT "case_people_case_id_person_id_pk" PRIMARY KEY("case_id","person_id")
);
--> statement-breakpoint
CREATE TABLE "case_questions" (
	"id" uuid PRIMARY KEY NOT NULL,
	"case_id" uuid NOT NULL,
	"version" integer NOT NULL,
	"questions" jsonb NOT NULL,
	"beside_scope" text DEFAULT '' NOT NULL,
	"reason" text,
	"made_by" uuid NOT NULL,
	"made_at" timestamp with time zone NOT NULL
);
--> statement-breakpoint
CREATE TABLE "cases" (
	"id" uuid PRIMARY KEY NOT NULL,
	"number" text NOT NULL,
	"title" text NOT NULL,
	"summary" text DEFAULT '' NOT NULL,
	"kind" text NOT NULL,
	"state" text NOT NULL,
	"hold_reason" text,
	"hold_until" date,
	"held_since" timestamp with time zone,
	"withdrawn_reason" text,
	"urgency" text NOT NULL,
	"organisation_id" uuid NOT NULL,
	"material_id" uuid,
	"assigned_to" uuid,
	"restricted" boolean DEFAULT false NOT NULL,
	"hold_for_litigation" boolean DEFAULT false NOT NULL,
	"scope" text DEFAULT '' NOT NULL,
	"received_at" timestamp with time zone NOT NULL,
	"state_since" timestamp with time zone NOT NULL,
	"closed_at" timestamp with time zone,
	"version" integer DEFAULT 1 NOT NULL,
	"search" "tsvector" GENERATED ALWAYS AS (to_tsvector('simple', "cases"."number" || ' ' || "cases"."title" || ' ' || "cases"."summary")) STORED,
	CONSTRAINT "cases_number_unique" UNIQUE("number")
);
--> statement-breakpoint
CREATE TABLE "accepted_notes" (
	"id" uuid PRIMARY KEY NOT NULL,
	"case_id" uuid NOT NULL,
	"note" text NOT NULL,
	"reason" text NOT NULL,
	"accepted_by" uuid NOT NULL,
	"accepted_at" timestamp with time zone NOT NULL
);
--> statement-breakpoint
CREATE TABLE "closures" (
	"id" uuid PRIMARY KEY NOT NULL,
	"case_id" uuid NOT NULL,
	"seal_number" text NOT NULL,
	"manifest" jsonb NOT NULL,
	"root_hash" text NOT NULL,
	"previous_root_hash" text NOT NULL,
	"closed_by" uuid NOT NULL,
	"closed_at" timestamp with time zone NOT NULL,
	CONSTRAINT "closures_caseId_unique" UNIQUE("case_id"),
	CONSTRAINT "closures_sealNumber_unique" UNIQUE("seal_number")
);
--> statement-breakpoint
CREATE TABLE "reviews" (
	"id" uuid PRIMARY KEY NOT NULL,
	"case_id" uuid NOT NULL,
	"round" integer NOT NULL,
	"findings_version_id" uuid NOT NULL,
	"sent_by" uuid NOT NULL,
	"sent_at" timestamp with time zone NOT NULL,
	"outcome" text,
	"reasons" text,
	"ended_by" uuid,
	"ended_at" timestamp with time zone,
	CONSTRAINT "reviews_round" UNIQUE("case_id","round")
);
--> statement-breakpoint
CREATE TABLE "signatures" (
	"id" uuid PRIMARY KEY NOT NULL,
	"case_id" uuid NOT NULL,
	"review_id" uuid NOT NULL,
	"person_id" uuid NOT NULL,
	"printed_name" text NOT NULL,
	"meaning" text NOT NULL,
	"content_hash" text NOT NULL,
	"proof" text NOT NULL,
	"signed_at" timestamp with time zone NOT NULL,
	"zone" text NOT NULL
);
--> statement-breakpoint
CREATE TABLE "estimate_inputs" (
	"id" uuid PRIMARY KEY NOT NULL,
	"case_id" uuid NOT NULL,
	"estimate_id" uuid NOT NULL,
	"name" text NOT NULL,
	"value" double precision NOT NULL,
	"standard_uncertainty" double precision NOT NULL,
	"unit" text NOT NULL,
	"distribution" text NOT NULL,
	"entered_text" text,
	"entered_unit" text,
	"source_kind" text NOT NULL,
	"source_id" uuid,
	"source_note" text DEFAULT '' NOT NULL
);
--> statement-breakpoint
CREATE TABLE "estimate_standings" (
	"id" uuid PRIMARY KEY NOT NULL,
	"case_id" uuid NOT NULL,
	"estimate_id" uuid NOT NULL,
	"standing" text NOT NULL,
	"reason" text NOT NULL,
	"made_by" uuid NOT NULL,
	"made_at" timestamp with time zone NOT NULL
);
--> statement-breakpoint
CREATE TABLE "estimates" (
	"id" uuid PRIMARY KEY NOT NULL,
	"case_id" uuid NOT NULL,
	"number" integer NOT NULL,
	"line" text NOT NULL,
	"method" text NOT NULL,
	"method_version" integer NOT NULL,
	"stress_mpa" double precision NOT NULL,
	"standard_uncertainty_mpa" double precision NOT NULL,
	"outputs" jsonb NOT NULL,
	"budget" jsonb NOT NULL,
	"cautions" jsonb NOT NULL,
	"supersedes_id" uuid,
	"remark" text DEFAULT '' NOT NULL,
	"made_by" uuid NOT NULL,
	"made_at" timestamp with time zone NOT NULL
);
--> statement-breakpoint
CREATE TABLE "fragments" (
	"id" uuid PRIMARY KEY NOT NULL,
	"case_id" uuid NOT NULL,
	"part_id" uuid NOT NULL,
	"parent_id" uuid,
	"code" text NOT NULL,
	"description" text NOT NULL,
	"way" text NOT NULL,
	"status" text NOT NULL,
	"missing_reason" text,
	"origin_lies" text,
	"mass_g" double precision,
	"mass_uncertainty_g" double precision,
	"place" text NOT NULL,
	"holder" text NOT NULL,
	"condition" text,
	"received_on" date,
	"made_at" timestamp with time zone NOT NULL,
	"version" integer DEFAULT 1 NOT NULL,
	CONSTRAINT "fragments_code" UNIQUE("case_id","code")
);
--> statement-breakpoint
CREATE TABLE "mates" (
	"id" uuid PRIMARY KEY NOT NULL,
	"case_id" uuid NOT NULL,
	"fragment_id" uuid NOT NULL,
	"face" text NOT NULL,
	"mate_fragment_id" uuid NOT NULL,
	"mate_face" text NOT NULL,
	"crack" text,
	"paired_by" uuid NOT NULL,
	"paired_at" timestamp with time zone NOT NULL,
	"parted_at" timestamp with time zone,
	"version" integer DEFAULT 1 NOT NULL
);
--> statement-breakpoint
CREATE TABLE "parts" (
	"id" uuid PRIMARY KEY NOT NULL,
	"case_id" uuid NOT NULL,
	"description" text NOT NULL,
	"serial" text,
	"drawing" text,
	"maker" text,
	"material_id" uuid,
	"environment" text,
	"temperature_c" double precision,
	"service_time" text,
	"made_at" timestamp with time zone NOT NULL,
	"version" integer DEFAULT 1 NOT NULL
);
--> statement-breakpoint
CREATE TABLE "bound_values" (
	"id" uuid PRIMARY KEY NOT NULL,
	"case_id" uuid NOT NULL,
	"source_kind" text NOT NULL,
	"source_id" uuid NOT NULL,
	"quantity" text NOT NULL,
	"format" jsonb NOT NULL,
	"supersedes_id" uuid,
	"made_by" uuid NOT NULL,
	"made_at" timestamp with time zone NOT NULL
);
--> statement-breakpoint
CREATE TABLE "figures" (
	"id" uuid PRIMARY KEY NOT NULL,
	"case_id" uuid NOT NULL,
	"fractograph_id" uuid NOT NULL,
	"frame_px" jsonb,
	"mark_ids" uuid[] NOT NULL,
	"caption" text NOT NULL,
	"scale_bar" boolean DEFAULT true NOT NULL,
	"supersedes_id" uuid,
	"made_by" uuid NOT NULL,
	"made_at" timestamp with time zone NOT NULL
);
--> statement-breakpoint
CREATE TABLE "findings_updates" (
	"id" bigint PRIMARY KEY GENERATED ALWAYS AS IDENTITY (sequence name "findings_updates_id_seq" INCREMENT BY 1 MINVALUE 1 MAXVALUE 9223372036854775807 START WITH 1 CACHE 1),
	"case_id" uuid NOT NULL,
	"update" "bytea" NOT NULL,
	"made_by" uuid,
	"made_at" timestamp with time zone NOT NULL
);
--> statement-breakpoint
CREATE TABLE "findings_versions" (
	"id" uuid PRIMARY KEY NOT NULL,
	"case_id" uuid NOT NULL,
	"number" integer NOT NULL,
	"name" text NOT NULL,
	"content" jsonb NOT NULL,
	"content_hash" text NOT NULL,
	"made_by" uuid NOT NULL,
	"made_at" timestamp with time zone NOT NULL,
	CONSTRAINT "findings_versions_number" UNIQUE("case_id","number")
);
--> statement-breakpoint
CREATE TABLE "calibration_bindings" (
	"id" uuid PRIMARY KEY NOT NULL,
	"case_id" uuid NOT NULL,
	"fractograph_id" uuid NOT NULL,
	"calibration_id" uuid NOT NULL,
	"supersedes_id" uuid,
	"reason" text,
	"bound_by" uuid NOT NULL,
	"bound_at" timestamp with time zone NOT NULL
);
--> statement-breakpoint
CREATE TABLE "calibrations" (
	"id" uuid PRIMARY KEY NOT NULL,
	"code" text,
	"instrument_id" uuid,
	"case_id" uuid,
	"setting" text,
	"way" text NOT NULL,
	"pixel_size_x_um" double precision NOT NULL,
	"pixel_size_y_um" double precision NOT NULL,
	"relative_uncertainty" double precision NOT NULL,
	"reading" jsonb NOT NULL,
	"source" text NOT NULL,
	"as_found_error_percent" double precision,
	"valid_from" date NOT NULL,
	"supersedes_id" uuid,
	"reason" text,
	"made_by" uuid NOT NULL,
	"made_at" timestamp with time zone NOT NULL
);
--> statement-breakpoint
CREATE TABLE "fractographs" (
	"id" uuid PRIMARY KEY NOT NULL,
	"case_id" uuid NOT NULL,
	"figure_number" integer NOT NULL,
	"sha256" text NOT NULL,
	"file_name" text NOT NULL,
	"bytes" bigint NOT NULL,
	"state" text NOT NULL,
	"refused_reason" text,
	"progress" double precision DEFAULT 0 NOT NULL,
	"format" text,
	"width_px" integer,
	"height_px" integer,
	"bit_depth" integer,
	"tag_pixel_size_um" double precision,
	"tag_source" text,
	"caption" text DEFAULT '' NOT NULL,
	"fragment_id" uuid,
	"face" text,
	"view" text,
	"standing" text DEFAULT 'record' NOT NULL,
	"instrument_id" uuid,
	"objective" text,
	"field_width_mm" double precision,
	"tilt_deg" double precision,
	"illumination" text,
	"detector" text,
	"coating" text,
	"taken_by" text,
	"taken_on" date,
	"brought_in_by" uuid NOT NULL,
	"brought_in_at" timestamp with time zone NOT NULL,
	"version" integer DEFAULT 1 NOT NULL,
	CONSTRAINT "fractographs_figure" UNIQUE("case_id","figure_number")
);
--> statement-breakpoint
CREATE TABLE "instruments" (
	"id" uuid PRIMARY KEY NOT NULL,
	"name" text NOT NULL,
	"kind" text NOT NULL,
	"version" integer DEFAULT 1 NOT NULL,
	CONSTRAINT "instruments_name_unique" UNIQUE("name")
);
--> statement-breakpoint
CREATE TABLE "kept_files" (
	"sha256" text PRIMARY KEY NOT NULL,
	"bytes" bigint NOT NULL,
	"kept_at" timestamp with time zone NOT NULL
);
--> statement-breakpoint
CREATE TABLE "held_mails" (
	"id" uuid PRIMARY KEY NOT NULL,
	"to_mail" text NOT NULL,
	"subject" text NOT NULL,
	"body" text NOT NULL,
	"held_at" timestamp with time zone NOT NULL
);
--> statement-breakpoint
CREATE TABLE "outgoing_mails" (
	"id" uuid PRIMARY KEY NOT NULL,
	"to_mail" text NOT NULL,
	"subject" text NOT NULL,
	"body" text NOT NULL,
	"link" text,
	"state" text NOT NULL,
	"tries" integer DEFAULT 0 NOT NULL,
	"fault" text,
	"written_at" timestamp with time zone NOT NULL,
	"gone_at" timestamp with time zone
);
--> statement-breakpoint
CREATE TABLE "mark_versions" (
	"id" uuid PRIMARY KEY NOT NULL,
	"case_id" uuid NOT NULL,
	"mark_id" uuid NOT NULL,
	"version" integer NOT NULL,
	"geometry" jsonb NOT NULL,
	"certainty" text NOT NULL,
	"boundary" text,
	"origin_code" text,
	"note" text DEFAULT '' NOT NULL,
	"removed" boolean DEFAULT false NOT NULL,
	"supersedes_id" uuid,
	"made_by" uuid NOT NULL,
	"made_at" timestamp with time zone NOT NULL,
	CONSTRAINT "mark_versions_version" UNIQUE("mark_id","version")
);
--> statement-breakpoint
CREATE TABLE "marks" (
	"id" uuid PRIMARY KEY NOT NULL,
	"case_id" uuid NOT NULL,
	"fractograph_id" uuid NOT NULL,
	"number" integer NOT NULL,
	"kind" text NOT NULL,
	CONSTRAINT "marks_number" UNIQUE("case_id","number")
);
--> statement-breakpoint
CREATE TABLE "measurements" (
	"id" uuid PRIMARY KEY NOT NULL,
	"case_id" uuid NOT NULL,
	"quantity" text NOT NULL,
	"mark_version_id" uuid NOT NULL,
	"binding_id" uuid NOT NULL,
	"value_px" double precision NOT NULL,
	"value_mm" double precision NOT NULL,
	"standard_uncertainty_mm" double precision NOT NULL,
	"read_by" uuid NOT NULL,
	"read_at" timestamp with time zone NOT NULL,
	CONSTRAINT "measurements_once" UNIQUE("mark_version_id","binding_id","quantity")
);
--> statement-breakpoint
CREATE TABLE "material_constants" (
	"id" uuid PRIMARY KEY NOT NULL,
	"material_id" uuid NOT NULL,
	"record_number" integer NOT NULL,
	"kind" text NOT NULL,
	"value" double precision NOT NULL,
	"standard_uncertainty" double precision NOT NULL,
	"entered_text" text NOT NULL,
	"entered_unit" text NOT NULL,
	"source" text NOT NULL,
	"source_standing" text NOT NULL,
	"condition" text,
	"valid_from" date NOT NULL,
	"supersedes_id" uuid,
	"reason" text,
	"made_by" uuid NOT NULL,
	"made_at" timestamp with time zone NOT NULL
);
--> statement-breakpoint
CREATE TABLE "materials" (
	"id" uuid PRIMARY KEY NOT NULL,
	"name" text NOT NULL,
	"family" text NOT NULL,
	"route" text,
	"grain_size_um" double precision,
	"note" text,
	"made_at" timestamp with time zone NOT NULL,
	"version" integer DEFAULT 1 NOT NULL,
	CONSTRAINT "materials_name_unique" UNIQUE("name")
);
--> statement-breakpoint
CREATE TABLE "one_time_links" (
	"id" uuid PRIMARY KEY NOT NULL,
	"purpose" text NOT NULL,
	"person_id" uuid NOT NULL,
	"token_hash" text NOT NULL,
	"made_by" uuid,
	"made_at" timestamp with time zone NOT NULL,
	"ends_at" timestamp with time zone NOT NULL,
	"used_at" timestamp with time zone,
	"taken_back_at" timestamp with time zone,
	CONSTRAINT "one_time_links_tokenHash_unique" UNIQUE("token_hash")
);
--> statement-breakpoint
CREATE TABLE "organisations" (
	"id" uuid PRIMARY KEY NOT NULL,
	"name" text NOT NULL,
	"kind" text NOT NULL,
	"version" integer DEFAULT 1 NOT NULL,
	CONSTRAINT "organisations_name_unique" UNIQUE("name")
);
--> statement-breakpoint
CREATE TABLE "people" (
	"id" uuid PRIMARY KEY NOT NULL,
	"organisation_id" uuid NOT NULL,
	"name" text NOT NULL,
	"mail" text NOT NULL,
	"password_hash" text,
	"state" text NOT NULL,
	"theme" text DEFAULT 'paper' NOT NULL,
	"roomy_rows" boolean DEFAULT false NOT NULL,
	"letter_keys" boolean DEFAULT true NOT NULL,
	"last_here_at" timestamp with time zone,
	"made_at" timestamp with time zone NOT NULL,
	"version" integer DEFAULT 1 NOT NULL
);
--> statement-breakpoint
CREATE TABLE "person_roles" (
	"person_id" uuid NOT NULL,
	"role" text NOT NULL,
	CONSTRAINT "person_roles_person_id_role_pk" PRIMARY KEY("person_id","role")
);
--> statement-breakpoint
CREATE TABLE "sign_in_tries" (
	"key" text PRIMARY KEY NOT NULL,
	"failures" integer NOT NULL,
	"first_at" timestamp with time zone NOT NULL,
	"locked_until" timestamp with time zone
);
--> statement-breakpoint
CREATE TABLE "sessions" (
	"sid" varchar PRIMARY KEY NOT NULL,
	"sess" json NOT NULL,
	"expire" timestamp (6) NOT NULL
);
--> statement-breakpoint
ALTER TABLE "case_authors" ADD CONSTRAINT "case_authors_case_id_cases_id_fk" FOREIGN KEY ("case_id") REFERENCES "public"."cases"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "case_authors" ADD CONSTRAINT "case_authors_person_id_people_id_fk" FOREIGN KEY ("person_id") REFERENCES "public"."people"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "case_background" ADD CONSTRAINT "case_background_case_id_cases_id_fk" FOREIGN KEY ("case_id") REFERENCES "public"."cases"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "case_background" ADD CONSTRAINT "case_background_made_by_people_id_fk" FOREIGN KEY ("made_by") REFERENCES "public"."people"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "case_people" ADD CONSTRAINT "case_people_case_id_cases_id_fk" FOREIGN KEY ("case_id") REFERENCES "public"."cases"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "case_people" ADD CONSTRAINT "case_people_person_id_people_id_fk" FOREIGN KEY ("person_id") REFERENCES "public"."people"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "case_questions" ADD CONSTRAINT "case_questions_case_id_cases_id_fk" FOREIGN KEY ("case_id") REFERENCES "public"."cases"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "case_questions" ADD CONSTRAINT "case_questions_made_by_people_id_fk" FOREIGN KEY ("made_by") REFERENCES "public"."people"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "cases" ADD CONSTRAINT "cases_organisation_id_organisations_id_fk" FOREIGN KEY ("organisation_id") REFERENCES "public"."organisations"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "cases" ADD CONSTRAINT "cases_material_id_materials_id_fk" FOREIGN KEY ("material_id") REFERENCES "public"."materials"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "cases" ADD CONSTRAINT "cases_assigned_to_people_id_fk" FOREIGN KEY ("assigned_to") REFERENCES "public"."people"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "accepted_notes" ADD CONSTRAINT "accepted_notes_case_id_cases_id_fk" FOREIGN KEY ("case_id") REFERENCES "public"."cases"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "accepted_notes" ADD CONSTRAINT "accepted_notes_accepted_by_people_id_fk" FOREIGN KEY ("accepted_by") REFERENCES "public"."people"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "closures" ADD CONSTRAINT "closures_case_id_cases_id_fk" FOREIGN KEY ("case_id") REFERENCES "public"."cases"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "closures" ADD CONSTRAINT "closures_closed_by_people_id_fk" FOREIGN KEY ("closed_by") REFERENCES "public"."people"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "reviews" ADD CONSTRAINT "reviews_case_id_cases_id_fk" FOREIGN KEY ("case_id") REFERENCES "public"."cases"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "reviews" ADD CONSTRAINT "reviews_findings_version_id_findings_versions_id_fk" FOREIGN KEY ("findings_version_id") REFERENCES "public"."findings_versions"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "reviews" ADD CONSTRAINT "reviews_sent_by_people_id_fk" FOREIGN KEY ("sent_by") REFERENCES "public"."people"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "reviews" ADD CONSTRAINT "reviews_ended_by_people_id_fk" FOREIGN KEY ("ended_by") REFERENCES "public"."people"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "signatures" ADD CONSTRAINT "signatures_case_id_cases_id_fk" FOREIGN KEY ("case_id") REFERENCES "public"."cases"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "signatures" ADD CONSTRAINT "signatures_review_id_reviews_id_fk" FOREIGN KEY ("review_id") REFERENCES "public"."reviews"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "signatures" ADD CONSTRAINT "signatures_person_id_people_id_fk" FOREIGN KEY ("person_id") REFERENCES "public"."people"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "estimate_inputs" ADD CONSTRAINT "estimate_inputs_case_id_cases_id_fk" FOREIGN KEY ("case_id") REFERENCES "public"."cases"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "estimate_inputs" ADD CONSTRAINT "estimate_inputs_estimate_id_estimates_id_fk" FOREIGN KEY ("estimate_id") REFERENCES "public"."estimates"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "estimate_standings" ADD CONSTRAINT "estimate_standings_case_id_cases_id_fk" FOREIGN KEY ("case_id") REFERENCES "public"."cases"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "estimate_standings" ADD CONSTRAINT "estimate_standings_estimate_id_estimates_id_fk" FOREIGN KEY ("estimate_id") REFERENCES "public"."estimates"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "estimate_standings" ADD CONSTRAINT "estimate_standings_made_by_people_id_fk" FOREIGN KEY ("made_by") REFERENCES "public"."people"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "estimates" ADD CONSTRAINT "estimates_case_id_cases_id_fk" FOREIGN KEY ("case_id") REFERENCES "public"."cases"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "estimates" ADD CONSTRAINT "estimates_made_by_people_id_fk" FOREIGN KEY ("made_by") REFERENCES "public"."people"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "fragments" ADD CONSTRAINT "fragments_case_id_cases_id_fk" FOREIGN KEY ("case_id") REFERENCES "public"."cases"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "fragments" ADD CONSTRAINT "fragments_part_id_parts_id_fk" FOREIGN KEY ("part_id") REFERENCES "public"."parts"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "mates" ADD CONSTRAINT "mates_case_id_cases_id_fk" FOREIGN KEY ("case_id") REFERENCES "public"."cases"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "mates" ADD CONSTRAINT "mates_fragment_id_fragments_id_fk" FOREIGN KEY ("fragment_id") REFERENCES "public"."fragments"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "mates" ADD CONSTRAINT "mates_mate_fragment_id_fragments_id_fk" FOREIGN KEY ("mate_fragment_id") REFERENCES "public"."fragments"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "mates" ADD CONSTRAINT "mates_paired_by_people_id_fk" FOREIGN KEY ("paired_by") REFERENCES "public"."people"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "parts" ADD CONSTRAINT "parts_case_id_cases_id_fk" FOREIGN KEY ("case_id") REFERENCES "public"."cases"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "parts" ADD CONSTRAINT "parts_material_id_materials_id_fk" FOREIGN KEY ("material_id") REFERENCES "public"."materials"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "bound_values" ADD CONSTRAINT "bound_values_case_id_cases_id_fk" FOREIGN KEY ("case_id") REFERENCES "public"."cases"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "bound_values" ADD CONSTRAINT "bound_values_made_by_people_id_fk" FOREIGN KEY ("made_by") REFERENCES "public"."people"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "figures" ADD CONSTRAINT "figures_case_id_cases_id_fk" FOREIGN KEY ("case_id") REFERENCES "public"."cases"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "figures" ADD CONSTRAINT "figures_fractograph_id_fractographs_id_fk" FOREIGN KEY ("fractograph_id") REFERENCES "public"."fractographs"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "figures" ADD CONSTRAINT "figures_made_by_people_id_fk" FOREIGN KEY ("made_by") REFERENCES "public"."people"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "findings_updates" ADD CONSTRAINT "findings_updates_case_id_cases_id_fk" FOREIGN KEY ("case_id") REFERENCES "public"."cases"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "findings_updates" ADD CONSTRAINT "findings_updates_made_by_people_id_fk" FOREIGN KEY ("made_by") REFERENCES "public"."people"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "findings_versions" ADD CONSTRAINT "findings_versions_case_id_cases_id_fk" FOREIGN KEY ("case_id") REFERENCES "public"."cases"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "findings_versions" ADD CONSTRAINT "findings_versions_made_by_people_id_fk" FOREIGN KEY ("made_by") REFERENCES "public"."people"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "calibration_bindings" ADD CONSTRAINT "calibration_bindings_case_id_cases_id_fk" FOREIGN KEY ("case_id") REFERENCES "public"."cases"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "calibration_bindings" ADD CONSTRAINT "calibration_bindings_fractograph_id_fractographs_id_fk" FOREIGN KEY ("fractograph_id") REFERENCES "public"."fractographs"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "calibration_bindings" ADD CONSTRAINT "calibration_bindings_calibration_id_calibrations_id_fk" FOREIGN KEY ("calibration_id") REFERENCES "public"."calibrations"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "calibration_bindings" ADD CONSTRAINT "calibration_bindings_bound_by_people_id_fk" FOREIGN KEY ("bound_by") REFERENCES "public"."people"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "calibrations" ADD CONSTRAINT "calibrations_instrument_id_instruments_id_fk" FOREIGN KEY ("instrument_id") REFERENCES "public"."instruments"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "calibrations" ADD CONSTRAINT "calibrations_case_id_cases_id_fk" FOREIGN KEY ("case_id") REFERENCES "public"."cases"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "calibrations" ADD CONSTRAINT "calibrations_made_by_people_id_fk" FOREIGN KEY ("made_by") REFERENCES "public"."people"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "fractographs" ADD CONSTRAINT "fractographs_case_id_cases_id_fk" FOREIGN KEY ("case_id") REFERENCES "public"."cases"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "fractographs" ADD CONSTRAINT "fractographs_sha256_kept_files_sha256_fk" FOREIGN KEY ("sha256") REFERENCES "public"."kept_files"("sha256") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "fractographs" ADD CONSTRAINT "fractographs_fragment_id_fragments_id_fk" FOREIGN KEY ("fragment_id") REFERENCES "public"."fragments"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "fractographs" ADD CONSTRAINT "fractographs_instrument_id_instruments_id_fk" FOREIGN KEY ("instrument_id") REFERENCES "public"."instruments"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "fractographs" ADD CONSTRAINT "fractographs_brought_in_by_people_id_fk" FOREIGN KEY ("brought_in_by") REFERENCES "public"."people"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "mark_versions" ADD CONSTRAINT "mark_versions_case_id_cases_id_fk" FOREIGN KEY ("case_id") REFERENCES "public"."cases"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "mark_versions" ADD CONSTRAINT "mark_versions_mark_id_marks_id_fk" FOREIGN KEY ("mark_id") REFERENCES "public"."marks"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "mark_versions" ADD CONSTRAINT "mark_versions_made_by_people_id_fk" FOREIGN KEY ("made_by") REFERENCES "public"."people"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "marks" ADD CONSTRAINT "marks_case_id_cases_id_fk" FOREIGN KEY ("case_id") REFERENCES "public"."cases"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "marks" ADD CONSTRAINT "marks_fractograph_id_fractographs_id_fk" FOREIGN KEY ("fractograph_id") REFERENCES "public"."fractographs"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "measurements" ADD CONSTRAINT "measurements_case_id_cases_id_fk" FOREIGN KEY ("case_id") REFERENCES "public"."cases"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "measurements" ADD CONSTRAINT "measurements_mark_version_id_mark_versions_id_fk" FOREIGN KEY ("mark_version_id") REFERENCES "public"."mark_versions"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "measurements" ADD CONSTRAINT "measurements_binding_id_calibration_bindings_id_fk" FOREIGN KEY ("binding_id") REFERENCES "public"."calibration_bindings"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "measurements" ADD CONSTRAINT "measurements_read_by_people_id_fk" FOREIGN KEY ("read_by") REFERENCES "public"."people"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "material_constants" ADD CONSTRAINT "material_constants_material_id_materials_id_fk" FOREIGN KEY ("material_id") REFERENCES "public"."materials"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "material_constants" ADD CONSTRAINT "material_constants_made_by_people_id_fk" FOREIGN KEY ("made_by") REFERENCES "public"."people"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "one_time_links" ADD CONSTRAINT "one_time_links_person_id_people_id_fk" FOREIGN KEY ("person_id") REFERENCES "public"."people"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "one_time_links" ADD CONSTRAINT "one_time_links_made_by_people_id_fk" FOREIGN KEY ("made_by") REFERENCES "public"."people"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "people" ADD CONSTRAINT "people_organisation_id_organisations_id_fk" FOREIGN KEY ("organisation_id") REFERENCES "public"."organisations"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "person_roles" ADD CONSTRAINT "person_roles_person_id_people_id_fk" FOREIGN KEY ("person_id") REFERENCES "public"."people"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
CREATE INDEX "audit_entries_chain_id_index" ON "audit_entries" USING btree ("chain","id" DESC NULLS LAST);--> statement-breakpoint
CREATE INDEX "audit_entries_at_index" ON "audit_entries" USING btree ("at");--> statement-breakpoint
CREATE INDEX "audit_entries_object_id_index" ON "audit_entries" USING btree ("object_id");--> statement-breakpoint
CREATE INDEX "lineage_up_idx" ON "lineage" USING btree ("to_id","from_id","from_kind","to_kind");--> statement-breakpoint
CREATE INDEX "staleness_case_idx" ON "staleness" USING btree ("case_id");--> statement-breakpoint
CREATE INDEX "staleness_cause_idx" ON "staleness" USING btree ("cause_id");--> statement-breakpoint
CREATE INDEX "case_background_case_id_index" ON "case_background" USING btree ("case_id");--> statement-breakpoint
CREATE INDEX "case_questions_case_id_version_index" ON "case_questions" USING btree ("case_id","version");--> statement-breakpoint
CREATE INDEX "cases_search_idx" ON "cases" USING gin ("search");--> statement-breakpoint
CREATE INDEX "cases_received_at_id_index" ON "cases" USING btree ("received_at" DESC NULLS LAST,"id");--> statement-breakpoint
CREATE INDEX "cases_state_received_at_index" ON "cases" USING btree ("state","received_at" DESC NULLS LAST);--> statement-breakpoint
CREATE INDEX "cases_organisation_id_received_at_index" ON "cases" USING btree ("organisation_id","received_at" DESC NULLS LAST);--> statement-breakpoint
CREATE INDEX "cases_assigned_to_received_at_index" ON "cases" USING btree ("assigned_to","received_at" DESC NULLS LAST);--> statement-breakpoint
CREATE INDEX "cases_material_id_index" ON "cases" USING btree ("material_id");--> statement-breakpoint
CREATE INDEX "accepted_notes_case_id_index" ON "accepted_notes" USING btree ("case_id");--> statement-breakpoint
CREATE INDEX "closures_closed_at_index" ON "closures" USING btree ("closed_at");--> statement-breakpoint
CREATE INDEX "signatures_case_id_index" ON "signatures" USING btree ("case_id");--> statement-breakpoint
CREATE INDEX "estimate_inputs_estimate_id_index" ON "estimate_inputs" USING btree ("estimate_id");--> statement-breakpoint
CREATE INDEX "estimate_standings_estimate_id_index" ON "estimate_standings" USING btree ("estimate_id");--> statement-breakpoint
CREATE INDEX "estimates_case_id_line_index" ON "estimates" USING btree ("case_id","line");--> statement-breakpoint
CREATE INDEX "estimates_supersedes_id_index" ON "estimates" USING btree ("supersedes_id");--> statement-breakpoint
CREATE INDEX "fragments_part_id_index" ON "fragments" USING btree ("part_id");--> statement-breakpoint
CREATE INDEX "mates_case_id_index" ON "mates" USING btree ("case_id");--> statement-breakpoint
CREATE INDEX "parts_case_id_index" ON "parts" USING btree ("case_id");--> statement-breakpoint
CREATE INDEX "bound_values_case_id_index" ON "bound_values" USING btree ("case_id");--> statement-breakpoint
CREATE INDEX "bound_values_source_id_index" ON "bound_values" USING btree ("source_id");--> statement-breakpoint
CREATE INDEX "figures_case_id_index" ON "figures" USING btree ("case_id");--> statement-breakpoint
CREATE INDEX "findings_updates_case_id_id_index" ON "findings_updates" USING btree ("case_id","id");--> statement-breakpoint
CREATE INDEX "calibration_bindings_fractograph_id_index" ON "calibration_bindings" USING btree ("fractograph_id");--> statement-breakpoint
CREATE INDEX "calibration_bindings_calibration_id_index" ON "calibration_bindings" USING btree ("calibration_id");--> statement-breakpoint
CREATE INDEX "calibrations_code_index" ON "calibrations" USING btree ("code");--> statement-breakpoint
CREATE INDEX "calibrations_supersedes_id_index" ON "calibrations" USING btree ("supersedes_id");--> statement-breakpoint
CREATE INDEX "calibrations_case_id_index" ON "calibrations" USING btree ("case_id");--> statement-breakpoint
CREATE INDEX "fractographs_sha256_index" ON "fractographs" USING btree ("sha256");--> statement-breakpoint
CREATE INDEX "outgoing_mails_state_index" ON "outgoing_mails" USING btree ("state");--> statement-breakpoint
CREATE INDEX "outgoing_mails_written_at_index" ON "outgoing_mails" USING btree ("written_at");--> statement-breakpoint
CREATE INDEX "mark_versions_case_id_index" ON "mark_versions" USING btree ("case_id");--> statement-breakpoint
CREATE INDEX "marks_fractograph_id_index" ON "marks" USING btree ("fractograph_id");--> statement-breakpoint
CREATE INDEX "measurements_case_id_index" ON "measurements" USING btree ("case_id");--> statement-breakpoint
CREATE INDEX "material_constants_material_id_kind_index" ON "material_constants" USING btree ("material_id","kind");--> statement-breakpoint
CREATE INDEX "material_constants_supersedes_id_index" ON "material_constants" USING btree ("supersedes_id");--> statement-breakpoint
CREATE UNIQUE INDEX "people_mail_idx" ON "people" USING btree (lower("mail"));--> statement-breakpoint
CREATE INDEX "people_organisation_id_index" ON "people" USING btree ("organisation_id");--> statement-breakpoint
CREATE INDEX "sessions_expire_idx" ON "sessions" USING btree ("expire");