CREATE TABLE "adjustables" (
	"key" text PRIMARY KEY NOT NULL,
	"name" text NOT NULL,
	"axle" text NOT NULL,
	"unit" text NOT NULL,
	"up_name" text NOT NULL,
	"down_name" text NOT NULL,
	"small_step" double precision NOT NULL,
	"minutes" integer NOT NULL,
	"tools" text[] NOT NULL,
	"opens_car" boolean NOT NULL,
	"guide_slug" text,
	"about" text NOT NULL,
	"changed_by" uuid,
	CONSTRAINT "adjustables_key" CHECK ("adjustables"."key" ~ '^[a-z][a-z0-9_]{1,39}$'),
	CONSTRAINT "adjustables_axle" CHECK ("adjustables"."axle" in ('front', 'centre', 'rear', 'whole')),
	CONSTRAINT "adjustables_step" CHECK ("adjustables"."small_step" > 0),
	CONSTRAINT "adjustables_minutes" CHECK ("adjustables"."minutes" between 0 and 600)
);
--> statement-breakpoint
CREATE TABLE "audit_entries" (
	"id" bigserial PRIMARY KEY NOT NULL,
	"at" timestamp with time zone DEFAULT now() NOT NULL,
	"actor_id" uuid,
	"action" text NOT NULL,
	"subject_kind" text NOT NULL,
	"subject_id" text NOT NULL,
	"details" jsonb DEFAULT '{}'::jsonb NOT NULL,
	CONSTRAINT "audit_entries_action" CHECK ("audit_entries"."action" ~ '^[a-z_]+\.[a-z_]+$')
);
--> statement-breakpoint
CREATE TABLE "chapters" (
	"letter" text PRIMARY KEY NOT NULL,
	"name" text NOT NULL,
	"about" text NOT NULL,
	CONSTRAINT "chapters_letter" CHECK ("chapters"."letter" ~ '^[A-Z]$')
);
--> statement-breakpoint
CREATE TABLE "edit_notes" (
	"id" uuid PRIMARY KEY DEFAULT gen_random_uuid() NOT NULL,
	"edit_id" uuid NOT NULL,
	"author_id" uuid NOT NULL,
	"text" text NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "edit_notes_length" CHECK (char_length("edit_notes"."text") between 1 and 2000)
);
--> statement-breakpoint
CREATE TABLE "editions" (
	"id" uuid PRIMARY KEY DEFAULT gen_random_uuid() NOT NULL,
	"guide_id" uuid NOT NULL,
	"number" integer NOT NULL,
	"content" jsonb NOT NULL,
	"html" text NOT NULL,
	"parts" jsonb NOT NULL,
	"renderer_version" integer NOT NULL,
	"author_id" uuid NOT NULL,
	"approver_id" uuid NOT NULL,
	"edit_id" uuid,
	"summary" text NOT NULL,
	"published_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "editions_number" UNIQUE("guide_id","number"),
	CONSTRAINT "editions_edit" UNIQUE("edit_id"),
	CONSTRAINT "editions_guide_and_id" UNIQUE("guide_id","id"),
	CONSTRAINT "editions_number_positive" CHECK ("editions"."number" >= 1),
	CONSTRAINT "editions_not_own_approver" CHECK ("editions"."author_id" <> "editions"."approver_id")
);
--> statement-breakpoint
CREATE TABLE "edits" (
	"id" uuid PRIMARY KEY DEFAULT gen_random_uuid() NOT NULL,
	"guide_id" uuid,
	"base_edition_id" uuid,
	"chapter" text,
	"author_id" uuid NOT NULL,
	"content" jsonb NOT NULL,
	"summary" text DEFAULT '' NOT NULL,
	"state" text DEFAULT 'draft' NOT NULL,
	"version" integer DEFAULT 1 NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	"updated_at" timestamp with time zone DEFAULT now() NOT NULL,
	"sent_at" timestamp with time zone,
	CONSTRAINT "edits_guide_or_new" CHECK (("edits"."guide_id" is null) = ("edits"."base_edition_id" is null)),
	CONSTRAINT "edits_new_has_chapter" CHECK ("edits"."guide_id" is not null or "edits"."chapter" is not null),
	CONSTRAINT "edits_state" CHECK ("edits"."state" in ('draft', 'in_review', 'changes_asked', 'approved', 'declined', 'withdrawn')),
	CONSTRAINT "edits_sent_has_summary" CHECK ("edits"."state" in ('draft', 'withdrawn') or char_length("edits"."summary") >= 3),
	CONSTRAINT "edits_version" CHECK ("edits"."version" >= 1)
);
--> statement-breakpoint
CREATE TABLE "effects" (
	"id" uuid PRIMARY KEY DEFAULT gen_random_uuid() NOT NULL,
	"guide_id" uuid NOT NULL,
	"edition_id" uuid NOT NULL,
	"position" integer NOT NULL,
	"adjustable" text NOT NULL,
	"direction" text NOT NULL,
	"phase" text NOT NULL,
	"quality" text NOT NULL,
	"change" text NOT NULL,
	"strength" integer NOT NULL,
	"surfaces" text[] NOT NULL,
	"bites" text[] NOT NULL,
	"car_classes" text[] NOT NULL,
	"mirrors" boolean NOT NULL,
	"basis" text NOT NULL,
	"note" text NOT NULL,
	CONSTRAINT "effects_position" UNIQUE("guide_id","position"),
	CONSTRAINT "effects_direction" CHECK ("effects"."direction" in ('up', 'down')),
	CONSTRAINT "effects_phase" CHECK ("effects"."phase" in ('entry', 'middle', 'exit', 'straight', 'bumps', 'jumps')),
	CONSTRAINT "effects_quality" CHECK ("effects"."quality" in ('steering', 'rear_grip', 'drive', 'stability', 'roll', 'roll_over_safety', 'absorption', 'nose_up', 'landing', 'acceleration', 'top_speed', 'run_time', 'motor_heat')),
	CONSTRAINT "effects_change" CHECK ("effects"."change" in ('more', 'less')),
	CONSTRAINT "effects_strength" CHECK ("effects"."strength" between 1 and 3),
	CONSTRAINT "effects_basis" CHECK ("effects"."basis" in ('physics', 'common_practice', 'reported')),
	CONSTRAINT "effects_surfaces" CHECK ("effects"."surfaces" <@ array['loose', 'loam', 'hard_packed', 'blue_groove', 'dusty', 'wet', 'artificial_turf', 'carpet']::text[]),
	CONSTRAINT "effects_bites" CHECK ("effects"."bites" <@ array['low', 'medium', 'high']::text[]),
	CONSTRAINT "effects_classes" CHECK ("effects"."car_classes" <@ array['buggy_8e', 'buggy_8n', 'truggy_8', 'buggy_10_4wd', 'buggy_10_2wd', 'truck_10', 'short_course_10']::text[])
);
--> statement-breakpoint
CREATE TABLE "glossary_terms" (
	"key" text PRIMARY KEY NOT NULL,
	"term" text NOT NULL,
	"short" text NOT NULL,
	"long" text DEFAULT '' NOT NULL,
	"standard" text DEFAULT '' NOT NULL,
	CONSTRAINT "glossary_terms_key" CHECK ("glossary_terms"."key" ~ '^[a-z0-9]+(-[a-z0-9]+)*$')
);
--> statement-breakpoint
CREATE TABLE "guides" (
	"id" uuid PRIMARY KEY DEFAULT gen_random_uuid() NOT NULL,
	"slug" text NOT NULL,
	"chapter" text NOT NULL,
	"number" integer NOT NULL,
	"published_edition_id" uuid,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "guides_slug_unique" UNIQUE("slug"),
	CONSTRAINT "guides_mark" UNIQUE("chapter","number"),
	CONSTRAINT "guides_number" CHECK ("guides"."number" between 1 and 999),
	CONSTRAINT "guides_slug" CHECK ("guides"."slug" ~ '^[a-z0-9]+(-[a-z0-9]+)*$' and char_length("guides"."slug") <= 90)
);
--> statement-breakpoint
CREATE TABLE "idempotency_keys" (
	"member_id" uuid NOT NULL,
	"key" text NOT NULL,
	"request_hash" text NOT NULL,
	"status" integer,
	"body" jsonb,
	"headers" jsonb,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "idempotency_keys_pkey" PRIMARY KEY("member_id","key"),
	CONSTRAINT "idempotency_keys_key" CHECK (char_length("idempotency_keys"."key") between 8 and 200)
);
--> statement-breakpoint
CREATE TABLE "members" (
	"id" uuid PRIMARY KEY DEFAULT gen_random_uuid() NOT NULL,
	"key" text,
	"name" text NOT NULL,
	"email" text,
	"password_hash" text,
	"role" text DEFAULT 'member' NOT NULL,
	"status" text DEFAULT 'active' NOT NULL,
	"about" text DEFAULT '' NOT NULL,
	"email_verified_at" timestamp with time zone,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "members_key_unique" UNIQUE("key"),
	CONSTRAINT "members_role" CHECK ("members"."role" in ('member', 'moderator', 'admin')),
	CONSTRAINT "members_status" CHECK ("members"."status" in ('active', 'suspended')),
	CONSTRAINT "members_name_length" CHECK (char_length("members"."name") between 2 and 60),
	CONSTRAINT "members_email_length" CHECK (char_length("members"."email") between 3 and 254),
	CONSTRAINT "members_can_sign_in" CHECK (("members"."email" is null) = ("members"."password_hash" is null))
);
--> statement-breakpoint
CREATE TABLE "outbox" (
	"id" uuid PRIMARY KEY DEFAULT gen_random_uuid() NOT NULL,
	"recipient" text NOT NULL,
	"subject" text NOT NULL,
	"body" text NOT NULL,
	"message_id" text NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	"attempts" integer DEFAULT 0 NOT NULL,
	"next_attempt_at" timestamp with time zone DEFAULT now() NOT NULL,
	"sent_at" timestamp with time zone,
	"dead_at" timestamp with time zone,
	"last_error" text DEFAULT '' NOT NULL,
	CONSTRAINT "outbox_message_id" UNIQUE("message_id"),
	CONSTRAINT "outbox_one_line" CHECK ("outbox"."recipient" !~ '[\r\n]' and "outbox"."subject" !~ '[\r\n]'),
	CONSTRAINT "outbox_sent_or_dead" CHECK ("outbox"."sent_at" is null or "outbox"."dead_at" is null)
);
--> statement-breakpoint
CREATE TABLE "rate_limits" (
	"key" text PRIMARY KEY NOT NULL,
	"points" integer DEFAULT 0 NOT NULL,
	"expire" bigint
);
--> statement-breakpoint
CREATE TABLE "reviews" (
	"id" uuid PRIMARY KEY DEFAULT gen_random_uuid() NOT NULL,
	"edit_id" uuid NOT NULL,
	"edit_version" integer NOT NULL,
	"reviewer_id" uuid NOT NULL,
	"decision" text NOT NULL,
	"reason" text DEFAULT '' NOT NULL,
	"decided_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "reviews_once_a_version" UNIQUE("edit_id","edit_version"),
	CONSTRAINT "reviews_decision" CHECK ("reviews"."decision" in ('approve', 'ask', 'decline')),
	CONSTRAINT "reviews_reason" CHECK ("reviews"."decision" = 'approve' or char_length("reviews"."reason") >= 3)
);
--> statement-breakpoint
CREATE TABLE "sessions" (
	"sid" text PRIMARY KEY NOT NULL,
	"sess" json NOT NULL,
	"expire" timestamp (6) NOT NULL,
	"member_id" uuid GENERATED ALWAYS AS (((sess ->> 'memberId')::uuid)) STORED
);
--> statement-breakpoint
CREATE TABLE "sign_in_tokens" (
	"id" uuid PRIMARY KEY DEFAULT gen_random_uuid() NOT NULL,
	"member_id" uuid NOT NULL,
	"purpose" text NOT NULL,
	"email" text NOT NULL,
	"secret_hash" text NOT NULL,
	"expires_at" timestamp with time zone NOT NULL,
	"used_at" timestamp with time zone,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "sign_in_tokens_secret" UNIQUE("secret_hash"),
	CONSTRAINT "sign_in_tokens_purpose" CHECK ("sign_in_tokens"."purpose" in ('verify', 'reset'))
);
--> statement-breakpoint
CREATE TABLE "slug_redirects" (
	"slug" text PRIMARY KEY NOT NULL,
	"guide_id" uuid NOT NULL
);
--> statement-breakpoint
CREATE TABLE "wanted_guides" (
	"id" uuid PRIMARY KEY DEFAULT gen_random_uuid() NOT NULL,
	"chapter" text NOT NULL,
	"title" text NOT NULL,
	"why" text NOT NULL,
	CONSTRAINT "wanted_guides_title" UNIQUE("title")
);
--> statement-breakpoint
ALTER TABLE "adjustables" ADD CONSTRAINT "adjustables_changed_by_members_id_fk" FOREIGN KEY ("changed_by") REFERENCES "public"."members"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "audit_entries" ADD CONSTRAINT "audit_entries_actor_id_members_id_fk" FOREIGN KEY ("actor_id") REFERENCES "public"."members"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "edit_notes" ADD CONSTRAINT "edit_notes_edit_id_edits_id_fk" FOREIGN KEY ("edit_id") REFERENCES "public"."edits"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "edit_notes" ADD CONSTRAINT "edit_notes_author_id_members_id_fk" FOREIGN KEY ("author_id") REFERENCES "public"."members"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "editions" ADD CONSTRAINT "editions_guide_id_guides_id_fk" FOREIGN KEY ("guide_id") REFERENCES "public"."guides"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "editions" ADD CONSTRAINT "editions_author_id_members_id_fk" FOREIGN KEY ("author_id") REFERENCES "public"."members"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "editions" ADD CONSTRAINT "editions_approver_id_members_id_fk" FOREIGN KEY ("approver_id") REFERENCES "public"."members"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "edits" ADD CONSTRAINT "edits_guide_id_guides_id_fk" FOREIGN KEY ("guide_id") REFERENCES "public"."guides"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "edits" ADD CONSTRAINT "edits_chapter_chapters_letter_fk" FOREIGN KEY ("chapter") REFERENCES "public"."chapters"("letter") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "edits" ADD CONSTRAINT "edits_author_id_members_id_fk" FOREIGN KEY ("author_id") REFERENCES "public"."members"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "edits" ADD CONSTRAINT "edits_base_of_same_guide" FOREIGN KEY ("guide_id","base_edition_id") REFERENCES "public"."editions"("guide_id","id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "effects" ADD CONSTRAINT "effects_guide_id_guides_id_fk" FOREIGN KEY ("guide_id") REFERENCES "public"."guides"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "effects" ADD CONSTRAINT "effects_edition_id_editions_id_fk" FOREIGN KEY ("edition_id") REFERENCES "public"."editions"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "effects" ADD CONSTRAINT "effects_adjustable_adjustables_key_fk" FOREIGN KEY ("adjustable") REFERENCES "public"."adjustables"("key") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "guides" ADD CONSTRAINT "guides_chapter_chapters_letter_fk" FOREIGN KEY ("chapter") REFERENCES "public"."chapters"("letter") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "guides" ADD CONSTRAINT "guides_published_edition_id_editions_id_fk" FOREIGN KEY ("published_edition_id") REFERENCES "public"."editions"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "idempotency_keys" ADD CONSTRAINT "idempotency_keys_member_id_members_id_fk" FOREIGN KEY ("member_id") REFERENCES "public"."members"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "reviews" ADD CONSTRAINT "reviews_edit_id_edits_id_fk" FOREIGN KEY ("edit_id") REFERENCES "public"."edits"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "reviews" ADD CONSTRAINT "reviews_reviewer_id_members_id_fk" FOREIGN KEY ("reviewer_id") REFERENCES "public"."members"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "sign_in_tokens" ADD CONSTRAINT "sign_in_tokens_member_id_members_id_fk" FOREIGN KEY ("member_id") REFERENCES "public"."members"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "slug_redirects" ADD CONSTRAINT "slug_redirects_guide_id_guides_id_fk" FOREIGN KEY ("guide_id") REFERENCES "public"."guides"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "wanted_guides" ADD CONSTRAINT "wanted_guides_chapter_chapters_letter_fk" FOREIGN KEY ("chapter") REFERENCES "public"."chapters"("letter") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
CREATE INDEX "audit_entries_subject" ON "audit_entries" USING btree ("subject_kind","subject_id","id");--> statement-breakpoint
CREATE INDEX "audit_entries_actor" ON "audit_entries" USING btree ("actor_id","id");--> statement-breakpoint
CREATE INDEX "edit_notes_edit" ON "edit_notes" USING btree ("edit_id","created_at");--> statement-breakpoint
CREATE INDEX "editions_published" ON "editions" USING btree ("published_at");--> statement-breakpoint
CREATE UNIQUE INDEX "edits_one_open_for_each_writer" ON "edits" USING btree ("author_id","guide_id") WHERE "edits"."state" in ('draft', 'in_review', 'changes_asked') and "edits"."guide_id" is not null;--> statement-breakpoint
CREATE INDEX "edits_queue" ON "edits" USING btree ("state","sent_at");--> statement-breakpoint
CREATE INDEX "edits_author" ON "edits" USING btree ("author_id","updated_at");--> statement-breakpoint
CREATE INDEX "edits_guide" ON "edits" USING btree ("guide_id");--> statement-breakpoint
CREATE INDEX "effects_lap" ON "effects" USING btree ("phase","quality");--> statement-breakpoint
CREATE INDEX "effects_adjustable" ON "effects" USING btree ("adjustable","direction");--> statement-breakpoint
CREATE UNIQUE INDEX "members_email_lower" ON "members" USING btree (lower("email"));--> statement-breakpoint
CREATE INDEX "outbox_waiting" ON "outbox" USING btree ("next_attempt_at") WHERE sent_at is null and dead_at is null;--> statement-breakpoint
CREATE INDEX "sessions_expire" ON "sessions" USING btree ("expire");--> statement-breakpoint
CREATE INDEX "sessions_member" ON "sessions" USING btree ("member_id");--> statement-breakpoint
CREATE INDEX "sign_in_tokens_member" ON "sign_in_tokens" USING btree ("member_id","purpose");