CREATE TYPE "public"."stage" AS ENUM('design', 'with-client', 'approved', 'cutting', 'assembly', 'delivered');--> statement-breakpoint
CREATE TABLE "people" (
	"id" uuid PRIMARY KEY DEFAULT gen_random_uuid() NOT NULL,
	"name" text NOT NULL,
	"email" text NOT NULL,
	"password_hash" text NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "people_email_unique" UNIQUE("email")
);
--> statement-breakpoint
CREATE TABLE "memberships" (
	"person_id" uuid NOT NULL,
	"workshop_id" uuid NOT NULL,
	"roles" text[] NOT NULL,
	"since" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "memberships_person_id_workshop_id_pk" PRIMARY KEY("person_id","workshop_id"),
	CONSTRAINT "memberships_roles_known" CHECK ("memberships"."roles" <@ ARRAY['owner', 'designer', 'maker', 'client'] AND cardinality("memberships"."roles") > 0)
);
--> statement-breakpoint
CREATE TABLE "workshops" (
	"id" uuid PRIMARY KEY DEFAULT gen_random_uuid() NOT NULL,
	"name" text NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL
);
--> statement-breakpoint
CREATE TABLE "rate_limits" (
	"key" text PRIMARY KEY NOT NULL,
	"hits" integer NOT NULL,
	"resets_at" timestamp with time zone NOT NULL
);
--> statement-breakpoint
CREATE TABLE "sessions" (
	"sid" text PRIMARY KEY NOT NULL,
	"sess" json NOT NULL,
	"expire" timestamp (6) with time zone NOT NULL
);
--> statement-breakpoint
CREATE TABLE "commissions" (
	"id" uuid PRIMARY KEY DEFAULT gen_random_uuid() NOT NULL,
	"workshop_id" uuid NOT NULL,
	"title" text NOT NULL,
	"client" text,
	"due" date,
	"stage" "stage" DEFAULT 'design' NOT NULL,
	"archived_at" timestamp with time zone,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	"updated_at" timestamp with time zone DEFAULT now() NOT NULL
);
--> statement-breakpoint
CREATE TABLE "layout_edits" (
	"layout_id" uuid NOT NULL,
	"revision" integer NOT NULL,
	"base_revision" integer NOT NULL,
	"patch" jsonb NOT NULL,
	"author_id" uuid NOT NULL,
	"idempotency_key" uuid NOT NULL,
	"request_digest" text NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "layout_edits_layout_id_revision_pk" PRIMARY KEY("layout_id","revision"),
	CONSTRAINT "layout_edits_idempotency_key" UNIQUE("layout_id","idempotency_key")
);
--> statement-breakpoint
CREATE TABLE "layouts" (
	"id" uuid PRIMARY KEY DEFAULT gen_random_uuid() NOT NULL,
	"commission_id" uuid NOT NULL,
	"document" jsonb NOT NULL,
	"revision" integer DEFAULT 0 NOT NULL,
	"summary" jsonb NOT NULL,
	"updated_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "layouts_commission_id_unique" UNIQUE("commission_id")
);
--> statement-breakpoint
CREATE TABLE "bundle_exports" (
	"id" uuid PRIMARY KEY DEFAULT gen_random_uuid() NOT NULL,
	"layout_id" uuid NOT NULL,
	"version_number" integer NOT NULL,
	"person_id" uuid NOT NULL,
	"exported_at" timestamp with time zone DEFAULT now() NOT NULL,
	"options" jsonb NOT NULL,
	"override_reason" text
);
--> statement-breakpoint
CREATE TABLE "versions" (
	"layout_id" uuid NOT NULL,
	"number" integer NOT NULL,
	"document" jsonb NOT NULL,
	"note" text NOT NULL,
	"kept_by" uuid NOT NULL,
	"kept_at" timestamp with time zone DEFAULT now() NOT NULL,
	"revision" integer NOT NULL,
	"restored_from" integer,
	"thumbnail" jsonb NOT NULL,
	CONSTRAINT "versions_layout_id_number_pk" PRIMARY KEY("layout_id","number")
);
--> statement-breakpoint
ALTER TABLE "memberships" ADD CONSTRAINT "memberships_person_id_people_id_fk" FOREIGN KEY ("person_id") REFERENCES "public"."people"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "memberships" ADD CONSTRAINT "memberships_workshop_id_workshops_id_fk" FOREIGN KEY ("workshop_id") REFERENCES "public"."workshops"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "commissions" ADD CONSTRAINT "commissions_workshop_id_workshops_id_fk" FOREIGN KEY ("workshop_id") REFERENCES "public"."workshops"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "layout_edits" ADD CONSTRAINT "layout_edits_layout_id_layouts_id_fk" FOREIGN KEY ("layout_id") REFERENCES "public"."layouts"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "layout_edits" ADD CONSTRAINT "layout_edits_author_id_people_id_fk" FOREIGN KEY ("author_id") REFERENCES "public"."people"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "layouts" ADD CONSTRAINT "layouts_commission_id_commissions_id_fk" FOREIGN KEY ("commission_id") REFERENCES "public"."commissions"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "bundle_exports" ADD CONSTRAINT "bundle_exports_person_id_people_id_fk" FOREIGN KEY ("person_id") REFERENCES "public"."people"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "bundle_exports" ADD CONSTRAINT "bundle_exports_layout_id_version_number_versions_layout_id_number_fk" FOREIGN KEY ("layout_id","version_number") REFERENCES "public"."versions"("layout_id","number") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "versions" ADD CONSTRAINT "versions_layout_id_layouts_id_fk" FOREIGN KEY ("layout_id") REFERENCES "public"."layouts"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "versions" ADD CONSTRAINT "versions_kept_by_people_id_fk" FOREIGN KEY ("kept_by") REFERENCES "public"."people"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
CREATE INDEX "sessions_expire" ON "sessions" USING btree ("expire");--> statement-breakpoint
CREATE INDEX "commissions_workshop" ON "commissions" USING btree ("workshop_id");