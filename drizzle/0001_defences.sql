-- Records are only ever added; what a seal rests on takes no write once the case is closed.
CREATE FUNCTION refuse_change_of_record() RETURNS trigger LANGUAGE plpgsql AS $$
BEGIN
  RAISE EXCEPTION USING ERRCODE = 'HB002',
    MESSAGE = format('a record of %s is kept as it was made; a new one is added instead', TG_TABLE_NAME);
END $$;
--> statement-breakpoint
DO $$
DECLARE name text;
BEGIN
  FOREACH name IN ARRAY ARRAY['audit_entries', 'lineage', 'material_constants', 'calibrations', 'calibration_bindings',
    'case_questions', 'mark_versions', 'measurements', 'estimates', 'estimate_inputs', 'estimate_standings',
    'findings_versions', 'bound_values', 'figures', 'signatures', 'closures', 'kept_files']
  LOOP
    EXECUTE format('CREATE TRIGGER %I BEFORE UPDATE OR DELETE ON %I FOR EACH ROW EXECUTE FUNCTION refuse_change_of_record()',
      name || '_record', name);
    EXECUTE format('CREATE TRIGGER %I BEFORE TRUNCATE ON %I FOR EACH STATEMENT EXECUTE FUNCTION refuse_change_of_record()',
      name || '_whole', name);
  END LOOP;
END $$;
--> statement-breakpoint
CREATE FUNCTION is_sealed(the_case uuid) RETURNS boolean LANGUAGE plpgsql AS $$
DECLARE the_state text;
BEGIN
  -- The share lock waits for a closure that is under way, so that nothing slips in beside it.
  SELECT state INTO the_state FROM cases WHERE id = the_case FOR SHARE;
  RETURN the_state = 'closed';
END $$;
--> statement-breakpoint
CREATE FUNCTION refuse_under_seal() RETURNS trigger LANGUAGE plpgsql AS $$
BEGIN
  IF TG_OP <> 'INSERT' AND OLD.case_id IS NOT NULL AND is_sealed(OLD.case_id) THEN
    RAISE EXCEPTION USING ERRCODE = 'HB001', MESSAGE = format('the case is closed; %s takes no change', TG_TABLE_NAME);
  END IF;
  IF TG_OP <> 'DELETE' AND NEW.case_id IS NOT NULL AND is_sealed(NEW.case_id) THEN
    RAISE EXCEPTION USING ERRCODE = 'HB001', MESSAGE = format('the case is closed; %s takes no change', TG_TABLE_NAME);
  END IF;
  IF TG_OP = 'DELETE' THEN RETURN OLD; END IF;
  RETURN NEW;
END $$;
--> statement-breakpoint
DO $$
DECLARE name text;
BEGIN
  FOREACH name IN ARRAY ARRAY['case_questions', 'case_background', 'case_authors', 'parts', 'fragments', 'mates', 'calibrations',
    'fractographs', 'calibration_bindings', 'marks', 'mark_versions', 'measurements', 'estimates', 'estimate_inputs',
    'estimate_standings', 'findings_updates', 'findings_versions', 'bound_values', 'figures', 'reviews', 'accepted_notes',
    'signatures', 'closures']
  LOOP
    EXECUTE format('CREATE TRIGGER %I BEFORE INSERT OR UPDATE OR DELETE ON %I FOR EACH ROW EXECUTE FUNCTION refuse_under_seal()',
      name || '_seal', name);
  END LOOP;
END $$;
--> statement-breakpoint
CREATE FUNCTION refuse_sealed_case() RETURNS trigger LANGUAGE plpgsql AS $$
BEGIN
  IF TG_OP = 'DELETE' THEN
    RAISE EXCEPTION USING ERRCODE = 'HB002', MESSAGE = 'a case is never deleted';
  END IF;
  -- A storage hold, the wall round the case and the row's version stay open after closure; nothing else does.
  IF OLD.state = 'closed' AND (to_jsonb(NEW) - ARRAY['hold_for_litigation', 'restricted', 'version', 'search'])
    IS DISTINCT FROM (to_jsonb(OLD) - ARRAY['hold_for_litigation', 'restricted', 'version', 'search']) THEN
    RAISE EXCEPTION USING ERRCODE = 'HB001', MESSAGE = 'the case is closed; it takes no change';
  END IF;
  RETURN NEW;
END $$;
--> statement-breakpoint
CREATE TRIGGER cases_seal BEFORE UPDATE OR DELETE ON cases FOR EACH ROW EXECUTE FUNCTION refuse_sealed_case();
--> statement-breakpoint
CREATE FUNCTION refuse_staleness_rewrite() RETURNS trigger LANGUAGE plpgsql AS $$
BEGIN
  IF TG_OP = 'DELETE' OR OLD.settled_at IS NOT NULL
    OR (to_jsonb(NEW) - ARRAY['settled_at', 'settled_by', 'settlement', 'reason'])
      IS DISTINCT FROM (to_jsonb(OLD) - ARRAY['settled_at', 'settled_by', 'settlement', 'reason']) THEN
    RAISE EXCEPTION USING ERRCODE = 'HB002', MESSAGE = 'staleness is settled once, by a person, and stays readable';
  END IF;
  RETURN NEW;
END $$;
--> statement-breakpoint
CREATE TRIGGER staleness_record BEFORE UPDATE OR DELETE ON staleness FOR EACH ROW EXECUTE FUNCTION refuse_staleness_rewrite();
--> statement-breakpoint
ALTER TABLE cases
  ADD CONSTRAINT cases_state_known CHECK (state IN ('received', 'examining', 'drafting', 'in review', 'closed', 'withdrawn')),
  ADD CONSTRAINT cases_hold_whole CHECK ((hold_reason IS NULL) = (hold_until IS NULL) AND (hold_reason IS NULL) = (held_since IS NULL)),
  ADD CONSTRAINT cases_closed_when CHECK ((state = 'closed') = (closed_at IS NOT NULL)),
  ADD CONSTRAINT cases_withdrawn_why CHECK ((state = 'withdrawn') = (withdrawn_reason IS NOT NULL)),
  ADD CONSTRAINT cases_number_form CHECK (number ~ '^HB-[0-9]{4}-[0-9]{4,}$');
--> statement-breakpoint
ALTER TABLE case_background ADD CONSTRAINT case_background_standing_known CHECK (standing IN ('known', 'told', 'assumed'));
--> statement-breakpoint
ALTER TABLE fragments
  ADD CONSTRAINT fragments_status_known CHECK (status IN ('present', 'missing', 'consumed')),
  ADD CONSTRAINT fragments_missing_said CHECK (status <> 'missing' OR (missing_reason IS NOT NULL AND origin_lies IS NOT NULL)),
  ADD CONSTRAINT fragments_mass_positive CHECK (mass_g IS NULL OR mass_g > 0);
--> statement-breakpoint
ALTER TABLE mates ADD CONSTRAINT mates_two_faces CHECK (fragment_id <> mate_fragment_id OR face <> mate_face);
--> statement-breakpoint
CREATE UNIQUE INDEX mates_face_once ON mates (fragment_id, face) WHERE parted_at IS NULL;
--> statement-breakpoint
CREATE UNIQUE INDEX mates_mate_face_once ON mates (mate_fragment_id, mate_face) WHERE parted_at IS NULL;
--> statement-breakpoint
ALTER TABLE fractographs
  ADD CONSTRAINT fractographs_state_known CHECK (state IN ('receiving', 'checking', 'cutting tiles', 'ready', 'refused')),
  ADD CONSTRAINT fractographs_refused_why CHECK ((state = 'refused') = (refused_reason IS NOT NULL)),
  ADD CONSTRAINT fractographs_progress_share CHECK (progress >= 0 AND progress <= 1),
  ADD CONSTRAINT fractographs_ready_whole CHECK (state <> 'ready' OR (width_px > 0 AND height_px > 0));
--> statement-breakpoint
ALTER TABLE calibrations
  ADD CONSTRAINT calibrations_size_positive CHECK (pixel_size_x_um > 0 AND pixel_size_y_um > 0 AND relative_uncertainty >= 0);
--> statement-breakpoint
CREATE UNIQUE INDEX calibrations_superseded_once ON calibrations (supersedes_id) WHERE supersedes_id IS NOT NULL;
--> statement-breakpoint
CREATE UNIQUE INDEX calibration_bindings_superseded_once ON calibration_bindings (supersedes_id) WHERE supersedes_id IS NOT NULL;
--> statement-breakpoint
CREATE UNIQUE INDEX calibration_bindings_first_once ON calibration_bindings (fractograph_id) WHERE supersedes_id IS NULL;
--> statement-breakpoint
CREATE UNIQUE INDEX material_constants_superseded_once ON material_constants (supersedes_id) WHERE supersedes_id IS NOT NULL;
--> statement-breakpoint
CREATE UNIQUE INDEX estimates_superseded_once ON estimates (supersedes_id) WHERE supersedes_id IS NOT NULL;
--> statement-breakpoint
ALTER TABLE material_constants ADD CONSTRAINT material_constants_positive CHECK (value > 0 AND standard_uncertainty >= 0);
--> statement-breakpoint
ALTER TABLE measurements ADD CONSTRAINT measurements_positive CHECK (value_px >= 0 AND value_mm >= 0 AND standard_uncertainty_mm > 0);
--> statement-breakpoint
ALTER TABLE estimates ADD CONSTRAINT estimates_interval CHECK (standard_uncertainty_mpa > 0);
--> statement-breakpoint
ALTER TABLE estimate_inputs ADD CONSTRAINT estimate_inputs_interval CHECK (standard_uncertainty >= 0);
--> statement-breakpoint
ALTER TABLE reviews ADD CONSTRAINT reviews_ended_whole CHECK ((outcome IS NULL) = (ended_at IS NULL) AND (outcome IS DISTINCT FROM 'sent back' OR reasons IS NOT NULL));
--> statement-breakpoint
ALTER TABLE outgoing_mails ADD CONSTRAINT outgoing_mails_link_erased CHECK (state <> 'gone' OR link IS NULL);
