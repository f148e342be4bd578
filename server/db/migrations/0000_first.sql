CREATE TABLE `audit_records` (
	`id` integer PRIMARY KEY AUTOINCREMENT NOT NULL,
	`at` text DEFAULT (strftime('%Y-%m-%dT%H:%M:%fZ', 'now')) NOT NULL,
	`actor` text NOT NULL,
	`action` text NOT NULL,
	`object_type` text NOT NULL,
	`object_id` text NOT NULL,
	`version` integer,
	`detail_json` text
);
--> statement-breakpoint
CREATE INDEX `audit_records_object` ON `audit_records` (`object_type`,`object_id`);--> statement-breakpoint
CREATE TABLE `regimen_versions` (
	`id` integer PRIMARY KEY AUTOINCREMENT NOT NULL,
	`regimen_id` text NOT NULL,
	`version` integer NOT NULL,
	`edition` text NOT NULL,
	`input_json` text NOT NULL,
	`plan_json` text NOT NULL,
	`created_at` text NOT NULL,
	FOREIGN KEY (`regimen_id`) REFERENCES `regimens`(`id`) ON UPDATE no action ON DELETE restrict
);
--> statement-breakpoint
CREATE UNIQUE INDEX `regimen_versions_regimen_id_version` ON `regimen_versions` (`regimen_id`,`version`);--> statement-breakpoint
CREATE TABLE `regimens` (
	`id` text PRIMARY KEY NOT NULL,
	`latest_version` integer NOT NULL,
	`key_hash` text NOT NULL,
	`link_expires_at` text NOT NULL,
	`team_id` text,
	`demo` integer DEFAULT false NOT NULL,
	`created_at` text NOT NULL,
	`updated_at` text NOT NULL
);
--> statement-breakpoint
CREATE INDEX `regimens_team_id` ON `regimens` (`team_id`);