CREATE UNLOGGED TABLE "presence" (
	"connection" uuid PRIMARY KEY NOT NULL,
	"layout_id" uuid NOT NULL,
	"person_id" uuid NOT NULL,
	"station" text NOT NULL,
	"tile" jsonb,
	"seen_at" timestamp with time zone DEFAULT now() NOT NULL
);
--> statement-breakpoint
ALTER TABLE "presence" ADD CONSTRAINT "presence_layout_id_layouts_id_fk" FOREIGN KEY ("layout_id") REFERENCES "public"."layouts"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "presence" ADD CONSTRAINT "presence_person_id_people_id_fk" FOREIGN KEY ("person_id") REFERENCES "public"."people"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
CREATE INDEX "presence_layout" ON "presence" USING btree ("layout_id");--> statement-breakpoint
-- Every server process listens: whoever has the layout open sees an edit at once, wherever it was saved.
CREATE FUNCTION tell_of_layout_edit() RETURNS trigger LANGUAGE plpgsql AS $$
BEGIN
	PERFORM pg_notify('layout_edited', NEW.layout_id::text);
	RETURN NULL;
END
$$;--> statement-breakpoint
CREATE TRIGGER layout_edits_tell AFTER INSERT ON "layout_edits" FOR EACH ROW EXECUTE FUNCTION tell_of_layout_edit();
