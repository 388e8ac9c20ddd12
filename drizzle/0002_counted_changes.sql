ALTER TABLE "editions" ADD COLUMN "changes" jsonb DEFAULT '{}'::jsonb NOT NULL;--> statement-breakpoint
ALTER TABLE "edits" ADD COLUMN "changes" jsonb;--> statement-breakpoint
ALTER TABLE "edits" ADD COLUMN "wanted_id" uuid;--> statement-breakpoint
CREATE INDEX "editions_author" ON "editions" USING btree ("author_id");--> statement-breakpoint
-- The counts are part of what was published: they never change either.
DROP TRIGGER editions_never_changed ON "editions";
--> statement-breakpoint
CREATE TRIGGER editions_never_changed BEFORE UPDATE ON "editions" FOR EACH ROW
  WHEN ((OLD.id, OLD.guide_id, OLD.number, OLD.content, OLD.author_id, OLD.approver_id, OLD.edit_id, OLD.summary, OLD.published_at, OLD.changes)
    IS DISTINCT FROM (NEW.id, NEW.guide_id, NEW.number, NEW.content, NEW.author_id, NEW.approver_id, NEW.edit_id, NEW.summary, NEW.published_at, NEW.changes)
    OR NEW.renderer_version < OLD.renderer_version)
  EXECUTE FUNCTION refuse_change();
