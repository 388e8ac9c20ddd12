CREATE TABLE "cars" (
	"member_id" uuid NOT NULL,
	"id" uuid NOT NULL,
	"name" text NOT NULL,
	"car_class" text,
	"values" jsonb NOT NULL,
	"chosen" boolean DEFAULT false NOT NULL,
	"version" integer DEFAULT 1 NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	"updated_at" timestamp with time zone DEFAULT now() NOT NULL,
	CONSTRAINT "cars_key" PRIMARY KEY("member_id","id"),
	CONSTRAINT "cars_one_of_a_name" UNIQUE("member_id","name"),
	CONSTRAINT "cars_name_length" CHECK (char_length("cars"."name") between 1 and 60),
	CONSTRAINT "cars_class" CHECK ("cars"."car_class" ~ '^[a-z0-9_]{1,40}$'),
	CONSTRAINT "cars_values_object" CHECK (jsonb_typeof("cars"."values") = 'object'),
	CONSTRAINT "cars_values_size" CHECK (octet_length("cars"."values"::text) <= 16384),
	CONSTRAINT "cars_version" CHECK ("cars"."version" >= 1)
);
--> statement-breakpoint
ALTER TABLE "cars" ADD CONSTRAINT "cars_member_id_members_id_fk" FOREIGN KEY ("member_id") REFERENCES "public"."members"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
CREATE UNIQUE INDEX "cars_one_chosen" ON "cars" USING btree ("member_id") WHERE "cars"."chosen";