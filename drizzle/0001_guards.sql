-- What the schema language cannot say: keys that point both ways, and rows that must never change.

ALTER TABLE "guides" ADD CONSTRAINT "guides_published_edition_is_its_own"
  FOREIGN KEY ("id", "published_edition_id") REFERENCES "editions" ("guide_id", "id");
--> statement-breakpoint
ALTER TABLE "editions" ADD CONSTRAINT "editions_edit_id_edits_id_fk" FOREIGN KEY ("edit_id") REFERENCES "edits" ("id");
--> statement-breakpoint
CREATE FUNCTION refuse_change() RETURNS trigger LANGUAGE plpgsql AS $$
BEGIN
  RAISE EXCEPTION '% rows are never changed or deleted', TG_TABLE_NAME USING ERRCODE = 'integrity_constraint_violation';
END $$;
--> statement-breakpoint
CREATE TRIGGER editions_never_deleted BEFORE DELETE ON "editions" FOR EACH ROW EXECUTE FUNCTION refuse_change();
--> statement-breakpoint
CREATE TRIGGER editions_never_truncated BEFORE TRUNCATE ON "editions" FOR EACH STATEMENT EXECUTE FUNCTION refuse_change();
--> statement-breakpoint
-- Only the rendering of an edition may be renewed, when the renderer's version rises.
CREATE TRIGGER editions_never_changed BEFORE UPDATE ON "editions" FOR EACH ROW
  WHEN ((OLD.id, OLD.guide_id, OLD.number, OLD.content, OLD.author_id, OLD.approver_id, OLD.edit_id, OLD.summary, OLD.published_at)
    IS DISTINCT FROM (NEW.id, NEW.guide_id, NEW.number, NEW.content, NEW.author_id, NEW.approver_id, NEW.edit_id, NEW.summary, NEW.published_at)
    OR NEW.renderer_version < OLD.renderer_version)
  EXECUTE FUNCTION refuse_change();
--> statement-breakpoint
CREATE TRIGGER audit_entries_never_changed BEFORE UPDATE OR DELETE ON "audit_entries" FOR EACH ROW EXECUTE FUNCTION refuse_change();
--> statement-breakpoint
CREATE TRIGGER audit_entries_never_truncated BEFORE TRUNCATE ON "audit_entries" FOR EACH STATEMENT EXECUTE FUNCTION refuse_change();
--> statement-breakpoint
CREATE FUNCTION refuse_own_review() RETURNS trigger LANGUAGE plpgsql AS $$
BEGIN
  IF EXISTS (SELECT 1 FROM edits WHERE id = NEW.edit_id AND author_id = NEW.reviewer_id) THEN
    RAISE EXCEPTION 'nobody decides on their own edit' USING ERRCODE = 'check_violation';
  END IF;
  RETURN NEW;
END $$;
--> statement-breakpoint
CREATE TRIGGER reviews_not_own BEFORE INSERT OR UPDATE ON "reviews" FOR EACH ROW EXECUTE FUNCTION refuse_own_review();
--> statement-breakpoint
CREATE FUNCTION refuse_reopening() RETURNS trigger LANGUAGE plpgsql AS $$
BEGIN
  IF OLD.state IN ('approved', 'declined', 'withdrawn') OR NEW.version <= OLD.version
    OR NEW.author_id <> OLD.author_id THEN
    RAISE EXCEPTION 'an edit only moves forward' USING ERRCODE = 'check_violation';
  END IF;
  RETURN NEW;
END $$;
--> statement-breakpoint
CREATE TRIGGER edits_only_forward BEFORE UPDATE ON "edits" FOR EACH ROW EXECUTE FUNCTION refuse_reopening();
--> statement-breakpoint
-- Every node empties the page cache of what was published.
CREATE FUNCTION notify_published() RETURNS trigger LANGUAGE plpgsql AS $$
BEGIN
  PERFORM pg_notify('published', NEW.slug);
  RETURN NULL;
END $$;
--> statement-breakpoint
CREATE TRIGGER guides_published AFTER INSERT OR UPDATE OF published_edition_id, slug ON "guides"
  FOR EACH ROW WHEN (NEW.published_edition_id IS NOT NULL) EXECUTE FUNCTION notify_published();
