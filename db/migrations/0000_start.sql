CREATE TABLE `activity` (
	`id` text PRIMARY KEY NOT NULL,
	`studio_id` text NOT NULL,
	`project_id` text,
	`person_id` text,
	`deed` text NOT NULL,
	`detail` text DEFAULT '' NOT NULL,
	`at` integer NOT NULL,
	FOREIGN KEY (`studio_id`) REFERENCES `studios`(`id`) ON UPDATE no action ON DELETE cascade,
	FOREIGN KEY (`project_id`) REFERENCES `projects`(`id`) ON UPDATE no action ON DELETE cascade,
	FOREIGN KEY (`person_id`) REFERENCES `people`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE INDEX `activity_project` ON `activity` (`project_id`,`at`);--> statement-breakpoint
CREATE TABLE `clients` (
	`id` text PRIMARY KEY NOT NULL,
	`studio_id` text NOT NULL,
	`project_id` text NOT NULL,
	`person_id` text NOT NULL,
	`created_at` integer NOT NULL,
	FOREIGN KEY (`studio_id`) REFERENCES `studios`(`id`) ON UPDATE no action ON DELETE cascade,
	FOREIGN KEY (`project_id`) REFERENCES `projects`(`id`) ON UPDATE no action ON DELETE cascade,
	FOREIGN KEY (`person_id`) REFERENCES `people`(`id`) ON UPDATE no action ON DELETE cascade
);
--> statement-breakpoint
CREATE INDEX `clients_project` ON `clients` (`project_id`);--> statement-breakpoint
CREATE UNIQUE INDEX `clients_person` ON `clients` (`person_id`);--> statement-breakpoint
CREATE TABLE `members` (
	`studio_id` text NOT NULL,
	`person_id` text NOT NULL,
	`role` text NOT NULL,
	`created_at` integer NOT NULL,
	PRIMARY KEY(`studio_id`, `person_id`),
	FOREIGN KEY (`studio_id`) REFERENCES `studios`(`id`) ON UPDATE no action ON DELETE cascade,
	FOREIGN KEY (`person_id`) REFERENCES `people`(`id`) ON UPDATE no action ON DELETE cascade,
	CONSTRAINT "members_role" CHECK("members"."role" in ('owner', 'designer', 'reviewer', 'estimator'))
);
--> statement-breakpoint
CREATE INDEX `members_person` ON `members` (`person_id`);--> statement-breakpoint
CREATE TABLE `people` (
	`id` text PRIMARY KEY NOT NULL,
	`email` text,
	`name` text NOT NULL,
	`password_hash` text,
	`created_at` integer NOT NULL,
	CONSTRAINT "people_email_lower" CHECK("people"."email" = lower("people"."email"))
);
--> statement-breakpoint
CREATE UNIQUE INDEX `people_email` ON `people` (`email`);--> statement-breakpoint
CREATE TABLE `rate_limits` (
	`key` text PRIMARY KEY NOT NULL,
	`points` integer DEFAULT 0 NOT NULL,
	`expire` integer
);
--> statement-breakpoint
CREATE TABLE `sessions` (
	`id` text PRIMARY KEY NOT NULL,
	`user_id` text NOT NULL,
	`expires_at` integer NOT NULL,
	`studio_id` text NOT NULL,
	`project_id` text,
	FOREIGN KEY (`user_id`) REFERENCES `people`(`id`) ON UPDATE no action ON DELETE cascade,
	FOREIGN KEY (`studio_id`) REFERENCES `studios`(`id`) ON UPDATE no action ON DELETE cascade,
	FOREIGN KEY (`project_id`) REFERENCES `projects`(`id`) ON UPDATE no action ON DELETE cascade
);
--> statement-breakpoint
CREATE INDEX `sessions_user` ON `sessions` (`user_id`);--> statement-breakpoint
CREATE TABLE `sign_in_links` (
	`id` text PRIMARY KEY NOT NULL,
	`token_hash` text NOT NULL,
	`studio_id` text NOT NULL,
	`project_id` text NOT NULL,
	`client_id` text NOT NULL,
	`expires_at` integer NOT NULL,
	`revoked_at` integer,
	`created_by` text NOT NULL,
	`created_at` integer NOT NULL,
	FOREIGN KEY (`studio_id`) REFERENCES `studios`(`id`) ON UPDATE no action ON DELETE cascade,
	FOREIGN KEY (`project_id`) REFERENCES `projects`(`id`) ON UPDATE no action ON DELETE cascade,
	FOREIGN KEY (`client_id`) REFERENCES `clients`(`id`) ON UPDATE no action ON DELETE cascade,
	FOREIGN KEY (`created_by`) REFERENCES `people`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE UNIQUE INDEX `sign_in_links_token` ON `sign_in_links` (`token_hash`);--> statement-breakpoint
CREATE INDEX `sign_in_links_project` ON `sign_in_links` (`project_id`);--> statement-breakpoint
CREATE TABLE `studios` (
	`id` text PRIMARY KEY NOT NULL,
	`name` text NOT NULL,
	`created_at` integer NOT NULL
);
--> statement-breakpoint
CREATE TABLE `plant_sources` (
	`id` text PRIMARY KEY NOT NULL,
	`plant_id` text NOT NULL,
	`title` text NOT NULL,
	`url` text NOT NULL,
	`evidence` text NOT NULL,
	`facts` text NOT NULL,
	`position` integer NOT NULL,
	FOREIGN KEY (`plant_id`) REFERENCES `plants`(`id`) ON UPDATE no action ON DELETE cascade,
	CONSTRAINT "plant_sources_evidence" CHECK("plant_sources"."evidence" in ('read', 'practice', 'memory'))
);
--> statement-breakpoint
CREATE INDEX `plant_sources_plant` ON `plant_sources` (`plant_id`);--> statement-breakpoint
CREATE TABLE `plants` (
	`id` text PRIMARY KEY NOT NULL,
	`studio_id` text,
	`botanical` text NOT NULL,
	`common` text NOT NULL,
	`category` text NOT NULL,
	`leaf` text NOT NULL,
	`height_min_in` real NOT NULL,
	`height_max_in` real NOT NULL,
	`spread_min_in` real NOT NULL,
	`spread_max_in` real NOT NULL,
	`habit` text NOT NULL,
	`growth` text NOT NULL,
	`zone_min` integer,
	`zone_max` integer,
	`light` text NOT NULL,
	`water` text NOT NULL,
	`foliage_color` text NOT NULL,
	`texture` text NOT NULL,
	`bloom_months` text NOT NULL,
	`bloom_color` text NOT NULL,
	`fall_color` text NOT NULL,
	`fruit_color` text NOT NULL,
	`fruit_months` text NOT NULL,
	`deer` text NOT NULL,
	`birds` text NOT NULL,
	`native` text NOT NULL,
	`thorns` integer NOT NULL,
	`toxicity` text NOT NULL,
	`juglone` text NOT NULL,
	`invasive` integer NOT NULL,
	`prune` text NOT NULL,
	`created_at` integer NOT NULL,
	FOREIGN KEY (`studio_id`) REFERENCES `studios`(`id`) ON UPDATE no action ON DELETE cascade,
	CONSTRAINT "plants_height" CHECK(0 < "plants"."height_min_in" and "plants"."height_min_in" <= "plants"."height_max_in"),
	CONSTRAINT "plants_spread" CHECK(0 < "plants"."spread_min_in" and "plants"."spread_min_in" <= "plants"."spread_max_in")
);
--> statement-breakpoint
CREATE UNIQUE INDEX `plants_shared_name` ON `plants` (`botanical`) WHERE "plants"."studio_id" is null;--> statement-breakpoint
CREATE UNIQUE INDEX `plants_studio_name` ON `plants` (`studio_id`,`botanical`);--> statement-breakpoint
CREATE TABLE `beds` (
	`id` text NOT NULL,
	`facade_id` text NOT NULL,
	`studio_id` text NOT NULL,
	`position` integer NOT NULL,
	`name` text NOT NULL,
	`outline` text NOT NULL,
	PRIMARY KEY(`facade_id`, `id`),
	FOREIGN KEY (`facade_id`) REFERENCES `facades`(`id`) ON UPDATE no action ON DELETE cascade,
	FOREIGN KEY (`studio_id`) REFERENCES `studios`(`id`) ON UPDATE no action ON DELETE cascade
);
--> statement-breakpoint
CREATE TABLE `edits` (
	`id` text NOT NULL,
	`facade_id` text NOT NULL,
	`studio_id` text NOT NULL,
	`person_id` text NOT NULL,
	`editor` text NOT NULL,
	`seq` integer NOT NULL,
	`kind` text NOT NULL,
	`target` text NOT NULL,
	`body` text NOT NULL,
	`at` integer NOT NULL,
	PRIMARY KEY(`facade_id`, `id`),
	FOREIGN KEY (`facade_id`) REFERENCES `facades`(`id`) ON UPDATE no action ON DELETE cascade,
	FOREIGN KEY (`studio_id`) REFERENCES `studios`(`id`) ON UPDATE no action ON DELETE cascade,
	FOREIGN KEY (`person_id`) REFERENCES `people`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE INDEX `edits_target` ON `edits` (`facade_id`,`kind`,`target`,`seq`);--> statement-breakpoint
CREATE INDEX `edits_seq` ON `edits` (`facade_id`,`seq`);--> statement-breakpoint
CREATE TABLE `facades` (
	`id` text PRIMARY KEY NOT NULL,
	`studio_id` text NOT NULL,
	`project_id` text NOT NULL,
	`name` text NOT NULL,
	`light` text NOT NULL,
	`facing` real,
	`wall` text NOT NULL,
	`grade` text NOT NULL,
	`fall` real NOT NULL,
	`gutter_in` real NOT NULL,
	`overhang_in` real NOT NULL,
	`siding` text NOT NULL,
	`exposed_in` real NOT NULL,
	`mulch_in` real NOT NULL,
	`seq` integer DEFAULT 0 NOT NULL,
	`engine` text DEFAULT '' NOT NULL,
	`created_at` integer NOT NULL,
	`updated_at` integer NOT NULL,
	FOREIGN KEY (`studio_id`) REFERENCES `studios`(`id`) ON UPDATE no action ON DELETE cascade,
	FOREIGN KEY (`project_id`) REFERENCES `projects`(`id`) ON UPDATE no action ON DELETE cascade
);
--> statement-breakpoint
CREATE INDEX `facades_project` ON `facades` (`project_id`);--> statement-breakpoint
CREATE INDEX `facades_studio` ON `facades` (`studio_id`);--> statement-breakpoint
CREATE TABLE `findings` (
	`facade_id` text NOT NULL,
	`key` text NOT NULL,
	`studio_id` text NOT NULL,
	`position` integer NOT NULL,
	`rule` text NOT NULL,
	`kind` text NOT NULL,
	`body` text NOT NULL,
	PRIMARY KEY(`facade_id`, `key`),
	FOREIGN KEY (`facade_id`) REFERENCES `facades`(`id`) ON UPDATE no action ON DELETE cascade,
	FOREIGN KEY (`studio_id`) REFERENCES `studios`(`id`) ON UPDATE no action ON DELETE cascade
);
--> statement-breakpoint
CREATE INDEX `findings_studio` ON `findings` (`studio_id`,`kind`);--> statement-breakpoint
CREATE TABLE `fixtures` (
	`id` text NOT NULL,
	`facade_id` text NOT NULL,
	`studio_id` text NOT NULL,
	`position` integer NOT NULL,
	`kind` text NOT NULL,
	`x_in` real NOT NULL,
	`y_in` real NOT NULL,
	`width_in` real NOT NULL,
	`depth_in` real NOT NULL,
	`z_in` real NOT NULL,
	`height_in` real NOT NULL,
	`outlet_in` real,
	PRIMARY KEY(`facade_id`, `id`),
	FOREIGN KEY (`facade_id`) REFERENCES `facades`(`id`) ON UPDATE no action ON DELETE cascade,
	FOREIGN KEY (`studio_id`) REFERENCES `studios`(`id`) ON UPDATE no action ON DELETE cascade
);
--> statement-breakpoint
CREATE TABLE `openings` (
	`id` text NOT NULL,
	`facade_id` text NOT NULL,
	`studio_id` text NOT NULL,
	`position` integer NOT NULL,
	`kind` text NOT NULL,
	`name` text NOT NULL,
	`x_in` real NOT NULL,
	`width_in` real NOT NULL,
	`sill_in` real NOT NULL,
	`head_in` real NOT NULL,
	PRIMARY KEY(`facade_id`, `id`),
	FOREIGN KEY (`facade_id`) REFERENCES `facades`(`id`) ON UPDATE no action ON DELETE cascade,
	FOREIGN KEY (`studio_id`) REFERENCES `studios`(`id`) ON UPDATE no action ON DELETE cascade,
	CONSTRAINT "openings_sill" CHECK("openings"."sill_in" < "openings"."head_in"),
	CONSTRAINT "openings_width" CHECK("openings"."width_in" > 0)
);
--> statement-breakpoint
CREATE TABLE `placements` (
	`id` text NOT NULL,
	`facade_id` text NOT NULL,
	`studio_id` text NOT NULL,
	`position` integer NOT NULL,
	`plant_id` text NOT NULL,
	`x_in` real NOT NULL,
	`y_in` real NOT NULL,
	`planted_height_in` real NOT NULL,
	`planted_spread_in` real NOT NULL,
	`role` text,
	`drift` text,
	`kept_height_in` real,
	`kept_spread_in` real,
	`clear_stem_in` real,
	`status` text,
	PRIMARY KEY(`facade_id`, `id`),
	FOREIGN KEY (`facade_id`) REFERENCES `facades`(`id`) ON UPDATE no action ON DELETE cascade,
	FOREIGN KEY (`studio_id`) REFERENCES `studios`(`id`) ON UPDATE no action ON DELETE cascade,
	FOREIGN KEY (`plant_id`) REFERENCES `plants`(`id`) ON UPDATE no action ON DELETE no action,
	CONSTRAINT "placements_planted" CHECK("placements"."planted_height_in" > 0 and "placements"."planted_spread_in" > 0)
);
--> statement-breakpoint
CREATE INDEX `placements_plant` ON `placements` (`plant_id`);--> statement-breakpoint
CREATE TABLE `projects` (
	`id` text PRIMARY KEY NOT NULL,
	`studio_id` text NOT NULL,
	`name` text NOT NULL,
	`address` text DEFAULT '' NOT NULL,
	`client_name` text DEFAULT '' NOT NULL,
	`stage` text DEFAULT 'draft' NOT NULL,
	`zone` text NOT NULL,
	`latitude` real,
	`longitude` real,
	`moisture` text NOT NULL,
	`deer` text NOT NULL,
	`walnut` text NOT NULL,
	`fire_zone` integer NOT NULL,
	`brief` text NOT NULL,
	`notes` text DEFAULT '' NOT NULL,
	`version` integer DEFAULT 0 NOT NULL,
	`created_at` integer NOT NULL,
	`updated_at` integer NOT NULL,
	FOREIGN KEY (`studio_id`) REFERENCES `studios`(`id`) ON UPDATE no action ON DELETE cascade,
	CONSTRAINT "projects_stage" CHECK("projects"."stage" in ('draft', 'in-review', 'returned', 'approved', 'proposed', 'accepted', 'planted'))
);
--> statement-breakpoint
CREATE INDEX `projects_studio` ON `projects` (`studio_id`,`updated_at`);--> statement-breakpoint
CREATE TABLE `standards` (
	`studio_id` text NOT NULL,
	`name` text NOT NULL,
	`number` real,
	`kind` text,
	`updated_at` integer NOT NULL,
	PRIMARY KEY(`studio_id`, `name`),
	FOREIGN KEY (`studio_id`) REFERENCES `studios`(`id`) ON UPDATE no action ON DELETE cascade,
	CONSTRAINT "standards_one" CHECK(("standards"."number" is null) <> ("standards"."kind" is null))
);
--> statement-breakpoint
CREATE TABLE `walks` (
	`id` text NOT NULL,
	`facade_id` text NOT NULL,
	`studio_id` text NOT NULL,
	`position` integer NOT NULL,
	`name` text NOT NULL,
	`outline` text NOT NULL,
	PRIMARY KEY(`facade_id`, `id`),
	FOREIGN KEY (`facade_id`) REFERENCES `facades`(`id`) ON UPDATE no action ON DELETE cascade,
	FOREIGN KEY (`studio_id`) REFERENCES `studios`(`id`) ON UPDATE no action ON DELETE cascade
);
