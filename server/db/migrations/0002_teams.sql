CREATE TABLE `approvals` (
	`id` integer PRIMARY KEY AUTOINCREMENT NOT NULL,
	`team_id` text NOT NULL,
	`regimen_id` text NOT NULL,
	`version` integer NOT NULL,
	`weight_g` real NOT NULL,
	`from_date` text NOT NULL,
	`good_until` text NOT NULL,
	`edition` text NOT NULL,
	`user_id` text NOT NULL,
	`vet_name` text NOT NULL,
	`registration` text NOT NULL,
	`note` text DEFAULT '' NOT NULL,
	`at` text NOT NULL,
	`lapsed_at` text,
	`lapse_reason` text,
	FOREIGN KEY (`regimen_id`) REFERENCES `regimens`(`id`) ON UPDATE no action ON DELETE restrict,
	FOREIGN KEY (`user_id`) REFERENCES `users`(`id`) ON UPDATE no action ON DELETE restrict
);
--> statement-breakpoint
CREATE INDEX `approvals_regimen_id` ON `approvals` (`regimen_id`,`version`);--> statement-breakpoint
CREATE INDEX `approvals_standing` ON `approvals` (`good_until`) WHERE lapsed_at is null;--> statement-breakpoint
CREATE TABLE `attempts` (
	`key` text PRIMARY KEY NOT NULL,
	`failures` integer NOT NULL,
	`last_at` text NOT NULL
);
--> statement-breakpoint
CREATE TABLE `feed_entries` (
	`id` integer PRIMARY KEY AUTOINCREMENT NOT NULL,
	`team_id` text NOT NULL,
	`regimen_id` text NOT NULL,
	`version` integer NOT NULL,
	`at` text NOT NULL,
	`due_at` text,
	`outcome` text NOT NULL,
	`taken_ml` real,
	`note` text DEFAULT '' NOT NULL,
	`initials` text NOT NULL,
	`by` text NOT NULL,
	`struck_at` text,
	`struck_reason` text,
	FOREIGN KEY (`regimen_id`) REFERENCES `regimens`(`id`) ON UPDATE no action ON DELETE restrict
);
--> statement-breakpoint
CREATE INDEX `feed_entries_regimen_id` ON `feed_entries` (`regimen_id`,`at`);--> statement-breakpoint
CREATE TABLE `helper_links` (
	`id` text PRIMARY KEY NOT NULL,
	`team_id` text NOT NULL,
	`regimen_id` text,
	`room` text,
	`purpose` text NOT NULL,
	`token_hash` text NOT NULL,
	`created_by` text NOT NULL,
	`created_at` text NOT NULL,
	`expires_at` text NOT NULL,
	`revoked_at` text,
	`opened` integer DEFAULT 0 NOT NULL,
	`last_opened_at` text,
	`last_initials` text,
	FOREIGN KEY (`team_id`) REFERENCES `teams`(`id`) ON UPDATE no action ON DELETE restrict,
	FOREIGN KEY (`regimen_id`) REFERENCES `regimens`(`id`) ON UPDATE no action ON DELETE restrict,
	FOREIGN KEY (`created_by`) REFERENCES `users`(`id`) ON UPDATE no action ON DELETE restrict
);
--> statement-breakpoint
CREATE UNIQUE INDEX `helper_links_token_hash` ON `helper_links` (`token_hash`);--> statement-breakpoint
CREATE INDEX `helper_links_team_id` ON `helper_links` (`team_id`,`created_at`);--> statement-breakpoint
CREATE TABLE `invitations` (
	`id` text PRIMARY KEY NOT NULL,
	`team_id` text NOT NULL,
	`email` text NOT NULL,
	`role` text NOT NULL,
	`token_hash` text NOT NULL,
	`invited_by` text NOT NULL,
	`created_at` text NOT NULL,
	`expires_at` text NOT NULL,
	`accepted_at` text,
	`withdrawn_at` text,
	FOREIGN KEY (`team_id`) REFERENCES `teams`(`id`) ON UPDATE no action ON DELETE restrict,
	FOREIGN KEY (`invited_by`) REFERENCES `users`(`id`) ON UPDATE no action ON DELETE restrict
);
--> statement-breakpoint
CREATE UNIQUE INDEX `invitations_token_hash` ON `invitations` (`token_hash`);--> statement-breakpoint
CREATE INDEX `invitations_team_id` ON `invitations` (`team_id`,`created_at`);--> statement-breakpoint
CREATE TABLE `mails` (
	`id` integer PRIMARY KEY AUTOINCREMENT NOT NULL,
	`team_id` text,
	`to_address` text NOT NULL,
	`kind` text NOT NULL,
	`subject` text NOT NULL,
	`text` text NOT NULL,
	`html` text NOT NULL,
	`state` text NOT NULL,
	`attempts` integer DEFAULT 0 NOT NULL,
	`created_at` text NOT NULL,
	`next_attempt_at` text,
	`sent_at` text,
	`problem` text
);
--> statement-breakpoint
CREATE INDEX `mails_state` ON `mails` (`state`,`next_attempt_at`);--> statement-breakpoint
CREATE INDEX `mails_team_id` ON `mails` (`team_id`,`created_at`);--> statement-breakpoint
CREATE TABLE `members` (
	`id` text PRIMARY KEY NOT NULL,
	`team_id` text NOT NULL,
	`user_id` text NOT NULL,
	`role` text NOT NULL,
	`joined_at` text NOT NULL,
	`left_at` text,
	FOREIGN KEY (`team_id`) REFERENCES `teams`(`id`) ON UPDATE no action ON DELETE restrict,
	FOREIGN KEY (`user_id`) REFERENCES `users`(`id`) ON UPDATE no action ON DELETE restrict
);
--> statement-breakpoint
CREATE UNIQUE INDEX `members_team_id_user_id` ON `members` (`team_id`,`user_id`) WHERE left_at is null;--> statement-breakpoint
CREATE INDEX `members_user_id` ON `members` (`user_id`);--> statement-breakpoint
CREATE TABLE `recovery_codes` (
	`user_id` text NOT NULL,
	`code_hash` text NOT NULL,
	`used_at` text,
	PRIMARY KEY(`user_id`, `code_hash`),
	FOREIGN KEY (`user_id`) REFERENCES `users`(`id`) ON UPDATE no action ON DELETE restrict
);
--> statement-breakpoint
CREATE TABLE `sessions` (
	`id` text PRIMARY KEY NOT NULL,
	`user_id` text NOT NULL,
	`team_id` text,
	`token_hash` text NOT NULL,
	`device` text DEFAULT '' NOT NULL,
	`address` text DEFAULT '' NOT NULL,
	`created_at` text NOT NULL,
	`last_seen_at` text NOT NULL,
	`expires_at` text NOT NULL,
	`ended_at` text,
	FOREIGN KEY (`user_id`) REFERENCES `users`(`id`) ON UPDATE no action ON DELETE restrict
);
--> statement-breakpoint
CREATE UNIQUE INDEX `sessions_token_hash` ON `sessions` (`token_hash`);--> statement-breakpoint
CREATE INDEX `sessions_user_id` ON `sessions` (`user_id`);--> statement-breakpoint
CREATE TABLE `teams` (
	`id` text PRIMARY KEY NOT NULL,
	`name` text NOT NULL,
	`settings_json` text NOT NULL,
	`demo` integer DEFAULT false NOT NULL,
	`created_at` text NOT NULL
);
--> statement-breakpoint
CREATE TABLE `transfers` (
	`id` text PRIMARY KEY NOT NULL,
	`team_id` text NOT NULL,
	`regimen_id` text NOT NULL,
	`token_hash` text NOT NULL,
	`note` text DEFAULT '' NOT NULL,
	`created_by_id` text NOT NULL,
	`created_at` text NOT NULL,
	`expires_at` text NOT NULL,
	`state` text DEFAULT 'open' NOT NULL,
	`decided_at` text,
	`decided_by` text,
	`other_team_id` text,
	`new_regimen_id` text,
	FOREIGN KEY (`team_id`) REFERENCES `teams`(`id`) ON UPDATE no action ON DELETE restrict,
	FOREIGN KEY (`regimen_id`) REFERENCES `regimens`(`id`) ON UPDATE no action ON DELETE restrict,
	FOREIGN KEY (`created_by_id`) REFERENCES `users`(`id`) ON UPDATE no action ON DELETE restrict
);
--> statement-breakpoint
CREATE UNIQUE INDEX `transfers_token_hash` ON `transfers` (`token_hash`);--> statement-breakpoint
CREATE INDEX `transfers_team_id` ON `transfers` (`team_id`,`created_at`);--> statement-breakpoint
CREATE TABLE `user_tokens` (
	`token_hash` text PRIMARY KEY NOT NULL,
	`user_id` text NOT NULL,
	`kind` text NOT NULL,
	`new_email` text,
	`created_at` text NOT NULL,
	`expires_at` text NOT NULL,
	`used_at` text,
	FOREIGN KEY (`user_id`) REFERENCES `users`(`id`) ON UPDATE no action ON DELETE restrict
);
--> statement-breakpoint
CREATE TABLE `users` (
	`id` text PRIMARY KEY NOT NULL,
	`name` text NOT NULL,
	`email` text NOT NULL,
	`password_hash` text NOT NULL,
	`registration` text DEFAULT '' NOT NULL,
	`codes_sealed` text,
	`codes_last_step` integer,
	`demo` integer DEFAULT false NOT NULL,
	`created_at` text NOT NULL
);
--> statement-breakpoint
CREATE UNIQUE INDEX `users_email` ON `users` (`email`);--> statement-breakpoint
CREATE TABLE `weigh_ins` (
	`id` integer PRIMARY KEY AUTOINCREMENT NOT NULL,
	`team_id` text NOT NULL,
	`regimen_id` text NOT NULL,
	`weight_g` real NOT NULL,
	`weighed_at` text NOT NULL,
	`by` text NOT NULL,
	`effect` text DEFAULT '' NOT NULL,
	`created_at` text NOT NULL,
	FOREIGN KEY (`regimen_id`) REFERENCES `regimens`(`id`) ON UPDATE no action ON DELETE restrict
);
--> statement-breakpoint
CREATE INDEX `weigh_ins_regimen_id` ON `weigh_ins` (`regimen_id`,`weighed_at`);--> statement-breakpoint
DROP INDEX `regimens_team_id`;--> statement-breakpoint
ALTER TABLE `regimens` ADD `state` text DEFAULT 'draft' NOT NULL;--> statement-breakpoint
ALTER TABLE `regimens` ADD `waiting` text;--> statement-breakpoint
ALTER TABLE `regimens` ADD `waiting_since` text;--> statement-breakpoint
ALTER TABLE `regimens` ADD `asked_by` text;--> statement-breakpoint
ALTER TABLE `regimens` ADD `drafted_by_id` text;--> statement-breakpoint
ALTER TABLE `regimens` ADD `drafted_by` text DEFAULT '' NOT NULL;--> statement-breakpoint
ALTER TABLE `regimens` ADD `checked_by_id` text;--> statement-breakpoint
ALTER TABLE `regimens` ADD `checked_by` text;--> statement-breakpoint
ALTER TABLE `regimens` ADD `checked_at` text;--> statement-breakpoint
ALTER TABLE `regimens` ADD `sent_back_json` text;--> statement-breakpoint
ALTER TABLE `regimens` ADD `ended_at` text;--> statement-breakpoint
ALTER TABLE `regimens` ADD `ended_reason` text;--> statement-breakpoint
ALTER TABLE `regimens` ADD `moved_at` text;--> statement-breakpoint
ALTER TABLE `regimens` ADD `animal_name` text DEFAULT '' NOT NULL;--> statement-breakpoint
ALTER TABLE `regimens` ADD `case_number` text DEFAULT '' NOT NULL;--> statement-breakpoint
ALTER TABLE `regimens` ADD `species_name` text DEFAULT '' NOT NULL;--> statement-breakpoint
ALTER TABLE `regimens` ADD `enclosure` text DEFAULT '' NOT NULL;--> statement-breakpoint
ALTER TABLE `regimens` ADD `room` text DEFAULT '' NOT NULL;--> statement-breakpoint
ALTER TABLE `regimens` ADD `weight_g` real DEFAULT 0 NOT NULL;--> statement-breakpoint
ALTER TABLE `regimens` ADD `good_until` text DEFAULT '' NOT NULL;--> statement-breakpoint
ALTER TABLE `regimens` ADD `search_text` text DEFAULT '' NOT NULL;--> statement-breakpoint
ALTER TABLE `regimens` ADD `last_weight_g` real;--> statement-breakpoint
ALTER TABLE `regimens` ADD `last_weighed_at` text;--> statement-breakpoint
CREATE INDEX `regimens_team_id_waiting` ON `regimens` (`team_id`,`waiting`,`waiting_since`);--> statement-breakpoint
CREATE INDEX `regimens_team_id_room` ON `regimens` (`team_id`,`room`);--> statement-breakpoint
CREATE INDEX `regimens_team_id` ON `regimens` (`team_id`,`updated_at`);--> statement-breakpoint
ALTER TABLE `audit_records` ADD `actor_name` text DEFAULT '' NOT NULL;--> statement-breakpoint
ALTER TABLE `audit_records` ADD `team_id` text;--> statement-breakpoint
ALTER TABLE `audit_records` ADD `object_name` text DEFAULT '' NOT NULL;--> statement-breakpoint
ALTER TABLE `audit_records` ADD `before_json` text;--> statement-breakpoint
ALTER TABLE `audit_records` ADD `after_json` text;--> statement-breakpoint
ALTER TABLE `audit_records` ADD `reason` text DEFAULT '' NOT NULL;--> statement-breakpoint
ALTER TABLE `audit_records` ADD `previous_hash` text;--> statement-breakpoint
ALTER TABLE `audit_records` ADD `hash` text;--> statement-breakpoint
CREATE INDEX `audit_records_team_id` ON `audit_records` (`team_id`,`id`);--> statement-breakpoint
ALTER TABLE `regimen_versions` ADD `author_id` text;--> statement-breakpoint
ALTER TABLE `regimen_versions` ADD `author` text DEFAULT '' NOT NULL;--> statement-breakpoint
ALTER TABLE `regimen_versions` ADD `note` text DEFAULT '' NOT NULL;