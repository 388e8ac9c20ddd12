CREATE TABLE "first_looks" (
	"id" uuid PRIMARY KEY DEFAULT gen_random_uuid() NOT NULL,
	"phase" text NOT NULL,
	"quality" text NOT NULL,
	"wants" text NOT NULL,
	"position" integer NOT NULL,
	"says" text NOT NULL,
	"changed_by" uuid,
	CONSTRAINT "first_looks_position" UNIQUE("phase","quality","wants","position"),
	CONSTRAINT "first_looks_phase" CHECK ("first_looks"."phase" in ('entry', 'middle', 'exit', 'straight', 'bumps', 'jumps')),
	CONSTRAINT "first_looks_quality" CHECK ("first_looks"."quality" in ('steering', 'rear_grip', 'drive', 'stability', 'roll', 'roll_over_safety', 'absorption', 'nose_up', 'landing', 'acceleration', 'top_speed', 'run_time', 'motor_heat')),
	CONSTRAINT "first_looks_wants" CHECK ("first_looks"."wants" in ('more', 'less')),
	CONSTRAINT "first_looks_length" CHECK (char_length("first_looks"."says") between 10 and 160)
);
--> statement-breakpoint
CREATE TABLE "heat_report_tallies" (
	"adjustable" text NOT NULL,
	"direction" text NOT NULL,
	"car_class" text NOT NULL,
	"surface" text NOT NULL,
	"bite" text NOT NULL,
	"helped" integer DEFAULT 0 NOT NULL,
	"same" integer DEFAULT 0 NOT NULL,
	"worse" integer DEFAULT 0 NOT NULL,
	CONSTRAINT "heat_report_tallies_pk" PRIMARY KEY("adjustable","direction","car_class","surface","bite"),
	CONSTRAINT "heat_report_tallies_counts" CHECK ("heat_report_tallies"."helped" >= 0 and "heat_report_tallies"."same" >= 0 and "heat_report_tallies"."worse" >= 0)
);
--> statement-breakpoint
CREATE TABLE "heat_reports" (
	"id" uuid PRIMARY KEY DEFAULT gen_random_uuid() NOT NULL,
	"member_id" uuid NOT NULL,
	"adjustable" text NOT NULL,
	"direction" text NOT NULL,
	"verdict" text NOT NULL,
	"car_class" text NOT NULL,
	"surface" text NOT NULL,
	"bite" text NOT NULL,
	"note" text DEFAULT '' NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	"changed_at" timestamp with time zone DEFAULT now() NOT NULL,
	"set_aside_by" uuid,
	"set_aside_why" text,
	CONSTRAINT "heat_reports_once" UNIQUE("member_id","adjustable","direction","car_class","surface","bite"),
	CONSTRAINT "heat_reports_direction" CHECK ("heat_reports"."direction" in ('up', 'down')),
	CONSTRAINT "heat_reports_verdict" CHECK ("heat_reports"."verdict" in ('helped', 'same', 'worse')),
	CONSTRAINT "heat_reports_class" CHECK ("heat_reports"."car_class" in ('buggy_8e', 'buggy_8n', 'truggy_8', 'buggy_10_4wd', 'buggy_10_2wd', 'truck_10', 'short_course_10')),
	CONSTRAINT "heat_reports_surface" CHECK ("heat_reports"."surface" in ('loose', 'loam', 'hard_packed', 'blue_groove', 'dusty', 'wet', 'artificial_turf', 'carpet')),
	CONSTRAINT "heat_reports_bite" CHECK ("heat_reports"."bite" in ('low', 'medium', 'high')),
	CONSTRAINT "heat_reports_note_length" CHECK (char_length("heat_reports"."note") <= 300),
	CONSTRAINT "heat_reports_set_aside" CHECK (("heat_reports"."set_aside_by" is null) = ("heat_reports"."set_aside_why" is null))
);
--> statement-breakpoint
ALTER TABLE "first_looks" ADD CONSTRAINT "first_looks_changed_by_members_id_fk" FOREIGN KEY ("changed_by") REFERENCES "public"."members"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "heat_report_tallies" ADD CONSTRAINT "heat_report_tallies_adjustable_adjustables_key_fk" FOREIGN KEY ("adjustable") REFERENCES "public"."adjustables"("key") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "heat_reports" ADD CONSTRAINT "heat_reports_member_id_members_id_fk" FOREIGN KEY ("member_id") REFERENCES "public"."members"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "heat_reports" ADD CONSTRAINT "heat_reports_adjustable_adjustables_key_fk" FOREIGN KEY ("adjustable") REFERENCES "public"."adjustables"("key") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "heat_reports" ADD CONSTRAINT "heat_reports_set_aside_by_members_id_fk" FOREIGN KEY ("set_aside_by") REFERENCES "public"."members"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
CREATE INDEX "heat_reports_change" ON "heat_reports" USING btree ("adjustable","direction","changed_at");--> statement-breakpoint
-- A report counts unless it was set aside or its member is suspended. The member's row is locked for the moment, so that
-- a suspension and a report that come together are added up one after the other.
CREATE FUNCTION heat_report_counts(report heat_reports) RETURNS boolean LANGUAGE plpgsql AS $$
BEGIN
  IF report.set_aside_by IS NOT NULL THEN RETURN false; END IF;
  PERFORM 1 FROM members WHERE id = report.member_id AND status = 'active' FOR SHARE;
  RETURN FOUND;
END $$;
--> statement-breakpoint
CREATE FUNCTION tally_heat_report(report heat_reports, step integer) RETURNS void LANGUAGE plpgsql AS $$
BEGIN
  INSERT INTO heat_report_tallies (adjustable, direction, car_class, surface, bite)
    VALUES (report.adjustable, report.direction, report.car_class, report.surface, report.bite) ON CONFLICT DO NOTHING;
  UPDATE heat_report_tallies t SET
    helped = t.helped + step * (report.verdict = 'helped')::int,
    same = t.same + step * (report.verdict = 'same')::int,
    worse = t.worse + step * (report.verdict = 'worse')::int
  WHERE (t.adjustable, t.direction, t.car_class, t.surface, t.bite)
    = (report.adjustable, report.direction, report.car_class, report.surface, report.bite);
END $$;
--> statement-breakpoint
CREATE FUNCTION keep_heat_report_tallies() RETURNS trigger LANGUAGE plpgsql AS $$
BEGIN
  IF TG_OP <> 'INSERT' AND heat_report_counts(OLD) THEN PERFORM tally_heat_report(OLD, -1); END IF;
  IF TG_OP <> 'DELETE' AND heat_report_counts(NEW) THEN PERFORM tally_heat_report(NEW, 1); END IF;
  RETURN NULL;
END $$;
--> statement-breakpoint
CREATE TRIGGER heat_reports_tallied AFTER INSERT OR UPDATE OR DELETE ON "heat_reports" FOR EACH ROW EXECUTE FUNCTION keep_heat_report_tallies();
--> statement-breakpoint
CREATE FUNCTION tally_reports_of_member() RETURNS trigger LANGUAGE plpgsql AS $$
BEGIN
  -- In one order, so that two suspensions at once never wait for each other's tallies.
  PERFORM tally_heat_report(own, CASE WHEN NEW.status = 'active' THEN 1 ELSE -1 END) FROM (
    SELECT report AS own FROM heat_reports report WHERE report.member_id = NEW.id AND report.set_aside_by IS NULL
    ORDER BY adjustable, direction, car_class, surface, bite
  ) ordered;
  RETURN NULL;
END $$;
--> statement-breakpoint
CREATE TRIGGER members_reports_count AFTER UPDATE OF status ON "members" FOR EACH ROW
  WHEN (OLD.status IS DISTINCT FROM NEW.status) EXECUTE FUNCTION tally_reports_of_member();
