CREATE TABLE `farms` (
	`id` text PRIMARY KEY NOT NULL,
	`slug` text NOT NULL,
	`name` text NOT NULL,
	`zone` text NOT NULL,
	`units` text NOT NULL,
	`latitude` real NOT NULL,
	`longitude` real NOT NULL,
	`invented` integer DEFAULT false NOT NULL,
	`revision` integer DEFAULT 0 NOT NULL,
	`created_at` integer NOT NULL
) STRICT;
--> statement-breakpoint
CREATE UNIQUE INDEX `farms_slug_unique` ON `farms` (`slug`);--> statement-breakpoint
CREATE TABLE `memberships` (
	`farm_id` text NOT NULL,
	`person_id` text NOT NULL,
	`role` text NOT NULL,
	`created_at` integer NOT NULL,
	PRIMARY KEY(`farm_id`, `person_id`),
	FOREIGN KEY (`farm_id`) REFERENCES `farms`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`person_id`) REFERENCES `people`(`id`) ON UPDATE no action ON DELETE no action,
	CONSTRAINT "memberships_role" CHECK("memberships"."role" in ('owner', 'agronomist', 'operator', 'crew'))
) STRICT;
--> statement-breakpoint
CREATE INDEX `memberships_by_person` ON `memberships` (`person_id`);--> statement-breakpoint
CREATE TABLE `places` (
	`id` text PRIMARY KEY NOT NULL,
	`latitude` real NOT NULL,
	`longitude` real NOT NULL,
	`elevation_m` real,
	`created_at` integer NOT NULL
) STRICT;
--> statement-breakpoint
CREATE TABLE `people` (
	`id` text PRIMARY KEY NOT NULL,
	`email` text NOT NULL,
	`name` text NOT NULL,
	`password_hash` text NOT NULL,
	`demo` integer DEFAULT false NOT NULL,
	`disabled_at` integer,
	`created_at` integer NOT NULL
) STRICT;
--> statement-breakpoint
CREATE UNIQUE INDEX `people_email_unique` ON `people` (`email`);--> statement-breakpoint
CREATE TABLE `sessions` (
	`id_hash` text PRIMARY KEY NOT NULL,
	`person_id` text NOT NULL,
	`address` text NOT NULL,
	`created_at` integer NOT NULL,
	`last_seen_at` integer NOT NULL,
	`expires_at` integer NOT NULL,
	`ended_at` integer,
	FOREIGN KEY (`person_id`) REFERENCES `people`(`id`) ON UPDATE no action ON DELETE no action
) STRICT;
--> statement-breakpoint
CREATE INDEX `sessions_by_person` ON `sessions` (`person_id`);--> statement-breakpoint
CREATE TABLE `sign_in_tries` (
	`id` integer PRIMARY KEY AUTOINCREMENT NOT NULL,
	`account_hash` text NOT NULL,
	`address` text NOT NULL,
	`at` integer NOT NULL
) STRICT;
--> statement-breakpoint
CREATE INDEX `sign_in_tries_by_account` ON `sign_in_tries` (`account_hash`,`at`);--> statement-breakpoint
CREATE INDEX `sign_in_tries_by_address` ON `sign_in_tries` (`address`,`at`);--> statement-breakpoint
CREATE TABLE `crops` (
	`id` text PRIMARY KEY NOT NULL,
	`farm_id` text NOT NULL,
	`name` text NOT NULL,
	`kind` text NOT NULL,
	`goal_yield_bu_per_ac` real NOT NULL,
	`price_usd_per_bu` real NOT NULL,
	`minimum_soil_c` real NOT NULL,
	`planting_table` text NOT NULL,
	FOREIGN KEY (`farm_id`) REFERENCES `farms`(`id`) ON UPDATE no action ON DELETE no action
) STRICT;
--> statement-breakpoint
CREATE UNIQUE INDEX `crops_in_farm` ON `crops` (`farm_id`,`id`);--> statement-breakpoint
CREATE TABLE `fields` (
	`id` text PRIMARY KEY NOT NULL,
	`farm_id` text NOT NULL,
	`name` text NOT NULL,
	`area_ac` real NOT NULL,
	`latitude` real NOT NULL,
	`longitude` real NOT NULL,
	`place_id` text,
	`soil_id` text,
	`crop_id` text,
	`drainage` text NOT NULL,
	`residue_pct` real DEFAULT 30 NOT NULL,
	`chain` text NOT NULL,
	`created_at` integer NOT NULL,
	FOREIGN KEY (`farm_id`) REFERENCES `farms`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`place_id`) REFERENCES `places`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`farm_id`,`soil_id`) REFERENCES `soils`(`farm_id`,`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`farm_id`,`crop_id`) REFERENCES `crops`(`farm_id`,`id`) ON UPDATE no action ON DELETE no action,
	CONSTRAINT "fields_area" CHECK("fields"."area_ac" > 0)
) STRICT;
--> statement-breakpoint
CREATE UNIQUE INDEX `fields_in_farm` ON `fields` (`farm_id`,`id`);--> statement-breakpoint
CREATE UNIQUE INDEX `fields_by_name` ON `fields` (`farm_id`,`name`);--> statement-breakpoint
CREATE TABLE `soils` (
	`id` text PRIMARY KEY NOT NULL,
	`farm_id` text NOT NULL,
	`name` text NOT NULL,
	`sand_pct` real NOT NULL,
	`clay_pct` real NOT NULL,
	`organic_matter_pct` real NOT NULL,
	FOREIGN KEY (`farm_id`) REFERENCES `farms`(`id`) ON UPDATE no action ON DELETE no action
) STRICT;
--> statement-breakpoint
CREATE UNIQUE INDEX `soils_in_farm` ON `soils` (`farm_id`,`id`);--> statement-breakpoint
CREATE TABLE `machines` (
	`id` text PRIMARY KEY NOT NULL,
	`farm_id` text NOT NULL,
	`name` text NOT NULL,
	`pass` text NOT NULL,
	`driver` text,
	`width_ft` real,
	`speed_mph` real,
	`field_efficiency` real,
	`from_hour` real NOT NULL,
	`to_hour` real NOT NULL,
	`fold_minutes` real DEFAULT 10 NOT NULL,
	`road_mph` real DEFAULT 15 NOT NULL,
	`at_field_id` text,
	`down_until` integer,
	`down_reason` text,
	FOREIGN KEY (`farm_id`) REFERENCES `farms`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`farm_id`,`at_field_id`) REFERENCES `fields`(`farm_id`,`id`) ON UPDATE no action ON DELETE no action
) STRICT;
--> statement-breakpoint
CREATE UNIQUE INDEX `machines_in_farm` ON `machines` (`farm_id`,`id`);--> statement-breakpoint
CREATE TABLE `pass_records` (
	`id` text PRIMARY KEY NOT NULL,
	`farm_id` text NOT NULL,
	`field_id` text NOT NULL,
	`machine_id` text,
	`pass` text NOT NULL,
	`area_ac` real NOT NULL,
	`started_at` integer NOT NULL,
	`ended_at` integer NOT NULL,
	`note` text,
	`entered_by` text,
	`entered_at` integer NOT NULL,
	FOREIGN KEY (`farm_id`) REFERENCES `farms`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`farm_id`,`field_id`) REFERENCES `fields`(`farm_id`,`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`farm_id`,`machine_id`) REFERENCES `machines`(`farm_id`,`id`) ON UPDATE no action ON DELETE no action
) STRICT;
--> statement-breakpoint
CREATE INDEX `pass_records_by_field` ON `pass_records` (`farm_id`,`field_id`);--> statement-breakpoint
CREATE TABLE `daily_weather` (
	`place_id` text NOT NULL,
	`zone` text NOT NULL,
	`local_day` text NOT NULL,
	`source` text NOT NULL,
	`rain_mm` real NOT NULL,
	`min_c` real NOT NULL,
	`max_c` real NOT NULL,
	`hours` integer NOT NULL,
	`issued_at` integer,
	`fetched_at` integer NOT NULL,
	PRIMARY KEY(`place_id`, `zone`, `local_day`, `source`),
	FOREIGN KEY (`place_id`) REFERENCES `places`(`id`) ON UPDATE no action ON DELETE no action
) STRICT;
--> statement-breakpoint
CREATE TABLE `forecasts` (
	`id` text PRIMARY KEY NOT NULL,
	`place_id` text NOT NULL,
	`kind` text NOT NULL,
	`source` text NOT NULL,
	`model` text NOT NULL,
	`issued_at` integer,
	`fetched_at` integer NOT NULL,
	`starts_at` integer NOT NULL,
	`hours` integer NOT NULL,
	`runs` integer NOT NULL,
	`variables` text NOT NULL,
	`data` blob NOT NULL,
	FOREIGN KEY (`place_id`) REFERENCES `places`(`id`) ON UPDATE no action ON DELETE no action
) STRICT;
--> statement-breakpoint
CREATE INDEX `forecasts_newest` ON `forecasts` (`place_id`,`kind`,`fetched_at`);--> statement-breakpoint
CREATE TABLE `hourly_weather` (
	`place_id` text NOT NULL,
	`starts_at` integer NOT NULL,
	`source` text NOT NULL,
	`issued_at` integer,
	`fetched_at` integer NOT NULL,
	`rain_mm` real NOT NULL,
	`temperature_c` real NOT NULL,
	`humidity_pct` real NOT NULL,
	`wind_ms` real NOT NULL,
	`wind_direction_deg` real,
	`gust_ms` real,
	`radiation_wm2` real NOT NULL,
	PRIMARY KEY(`place_id`, `starts_at`, `source`),
	FOREIGN KEY (`place_id`) REFERENCES `places`(`id`) ON UPDATE no action ON DELETE no action
) STRICT;
--> statement-breakpoint
CREATE TABLE `weather_pulls` (
	`id` integer PRIMARY KEY AUTOINCREMENT NOT NULL,
	`started_at` integer NOT NULL,
	`ended_at` integer,
	`places` integer NOT NULL,
	`stored` integer DEFAULT 0 NOT NULL,
	`outcome` text NOT NULL,
	`detail` text
) STRICT;
--> statement-breakpoint
CREATE INDEX `weather_pulls_newest` ON `weather_pulls` (`started_at`);--> statement-breakpoint
CREATE TABLE `audit_log` (
	`id` integer PRIMARY KEY AUTOINCREMENT NOT NULL,
	`farm_id` text,
	`person_id` text,
	`at` integer NOT NULL,
	`action` text NOT NULL,
	`subject` text NOT NULL,
	`subject_id` text NOT NULL,
	`before` text,
	`after` text
) STRICT;
--> statement-breakpoint
CREATE INDEX `audit_log_by_farm` ON `audit_log` (`farm_id`,`at`);--> statement-breakpoint
CREATE TABLE `demo_clock` (
	`id` integer PRIMARY KEY NOT NULL,
	`reached_at` integer NOT NULL,
	CONSTRAINT "demo_clock_one" CHECK("demo_clock"."id" = 1)
) STRICT;
--> statement-breakpoint
CREATE TABLE `idempotency_keys` (
	`farm_id` text NOT NULL,
	`person_id` text NOT NULL,
	`key` text NOT NULL,
	`method` text NOT NULL,
	`path` text NOT NULL,
	`body_hash` text NOT NULL,
	`status` integer NOT NULL,
	`body` text NOT NULL,
	`created_at` integer NOT NULL,
	PRIMARY KEY(`farm_id`, `person_id`, `key`)
) STRICT;
--> statement-breakpoint
CREATE TABLE `jobs` (
	`name` text PRIMARY KEY NOT NULL,
	`locked_by` text,
	`locked_until` integer,
	`last_success_at` integer,
	`last_failure` text,
	`retry_at` integer
) STRICT;
