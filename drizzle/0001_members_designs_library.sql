CREATE TABLE `audit_events` (
	`id` integer PRIMARY KEY AUTOINCREMENT NOT NULL,
	`at` integer NOT NULL,
	`actor_id` text,
	`actor_name` text NOT NULL,
	`action` text NOT NULL,
	`subject` text NOT NULL,
	`detail` text NOT NULL,
	FOREIGN KEY (`actor_id`) REFERENCES `users`(`id`) ON UPDATE no action ON DELETE set null
);
--> statement-breakpoint
CREATE INDEX `audit_events_at` ON `audit_events` (`at`);--> statement-breakpoint
CREATE INDEX `audit_events_actor` ON `audit_events` (`actor_id`);--> statement-breakpoint
CREATE TABLE `club_settings` (
	`id` integer PRIMARY KEY NOT NULL,
	`name` text NOT NULL,
	`contact_email` text,
	`changed_at` integer NOT NULL,
	CONSTRAINT "club_settings_one_row" CHECK("club_settings"."id" = 1)
);
--> statement-breakpoint
CREATE TABLE `design_states` (
	`id` text PRIMARY KEY NOT NULL,
	`design_id` text NOT NULL,
	`revision` integer NOT NULL,
	`name` text NOT NULL,
	`family` text NOT NULL,
	`material` text NOT NULL,
	`use` text NOT NULL,
	`values` text NOT NULL,
	`verdict` text NOT NULL,
	`saved_at` integer NOT NULL,
	FOREIGN KEY (`design_id`) REFERENCES `designs`(`id`) ON UPDATE no action ON DELETE cascade
);
--> statement-breakpoint
CREATE UNIQUE INDEX `design_states_revision` ON `design_states` (`design_id`,`revision`);--> statement-breakpoint
CREATE TABLE `designs` (
	`id` text PRIMARY KEY NOT NULL,
	`owner_id` text NOT NULL,
	`name` text NOT NULL,
	`family` text NOT NULL,
	`material` text NOT NULL,
	`use` text NOT NULL,
	`values` text NOT NULL,
	`verdict` text NOT NULL,
	`started_from` text,
	`revision` integer DEFAULT 1 NOT NULL,
	`created_at` integer NOT NULL,
	`changed_at` integer NOT NULL,
	`deleted_at` integer,
	FOREIGN KEY (`owner_id`) REFERENCES `users`(`id`) ON UPDATE no action ON DELETE cascade
);
--> statement-breakpoint
CREATE INDEX `designs_owner_changed` ON `designs` (`owner_id`,`changed_at`);--> statement-breakpoint
CREATE INDEX `designs_deleted` ON `designs` (`deleted_at`);--> statement-breakpoint
CREATE TABLE `favourites` (
	`user_id` text NOT NULL,
	`preset_id` text NOT NULL,
	`created_at` integer NOT NULL,
	PRIMARY KEY(`user_id`, `preset_id`),
	FOREIGN KEY (`user_id`) REFERENCES `users`(`id`) ON UPDATE no action ON DELETE cascade,
	FOREIGN KEY (`preset_id`) REFERENCES `presets`(`id`) ON UPDATE no action ON DELETE cascade
);
--> statement-breakpoint
CREATE INDEX `favourites_preset` ON `favourites` (`preset_id`);--> statement-breakpoint
CREATE TABLE `preset_photos` (
	`id` text PRIMARY KEY NOT NULL,
	`version_id` text,
	`owner_id` text,
	`file` text NOT NULL,
	`alt` text NOT NULL,
	`width` integer NOT NULL,
	`height` integer NOT NULL,
	`bytes` integer NOT NULL,
	`position` integer NOT NULL,
	`created_at` integer NOT NULL,
	FOREIGN KEY (`version_id`) REFERENCES `preset_versions`(`id`) ON UPDATE no action ON DELETE cascade,
	FOREIGN KEY (`owner_id`) REFERENCES `users`(`id`) ON UPDATE no action ON DELETE set null
);
--> statement-breakpoint
CREATE INDEX `preset_photos_version` ON `preset_photos` (`version_id`,`position`);--> statement-breakpoint
CREATE INDEX `preset_photos_owner` ON `preset_photos` (`owner_id`);--> statement-breakpoint
CREATE TABLE `preset_reports` (
	`id` text PRIMARY KEY NOT NULL,
	`version_id` text NOT NULL,
	`user_id` text,
	`user_name` text NOT NULL,
	`worked` integer NOT NULL,
	`printer` text NOT NULL,
	`material` text NOT NULL,
	`note` text NOT NULL,
	`created_at` integer NOT NULL,
	FOREIGN KEY (`version_id`) REFERENCES `preset_versions`(`id`) ON UPDATE no action ON DELETE cascade,
	FOREIGN KEY (`user_id`) REFERENCES `users`(`id`) ON UPDATE no action ON DELETE set null
);
--> statement-breakpoint
CREATE UNIQUE INDEX `preset_reports_once` ON `preset_reports` (`version_id`,`user_id`);--> statement-breakpoint
CREATE TABLE `preset_versions` (
	`id` text PRIMARY KEY NOT NULL,
	`preset_id` text NOT NULL,
	`number` integer NOT NULL,
	`state` text NOT NULL,
	`title` text NOT NULL,
	`purpose` text NOT NULL,
	`printing_notes` text NOT NULL,
	`tags` text NOT NULL,
	`licence` text NOT NULL,
	`family` text NOT NULL,
	`material` text NOT NULL,
	`use` text NOT NULL,
	`values` text NOT NULL,
	`verdict` text NOT NULL,
	`kind` text NOT NULL,
	`strain_share` real,
	`size_x` real NOT NULL,
	`size_y` real NOT NULL,
	`size_z` real NOT NULL,
	`mass` real,
	`enclosure` text,
	`started_from` text,
	`handed_in_at` integer NOT NULL,
	`decided_at` integer,
	`decided_by` text,
	`decision_note` text,
	FOREIGN KEY (`preset_id`) REFERENCES `presets`(`id`) ON UPDATE no action ON DELETE cascade,
	FOREIGN KEY (`decided_by`) REFERENCES `users`(`id`) ON UPDATE no action ON DELETE set null,
	CONSTRAINT "preset_versions_state_word" CHECK("preset_versions"."state" in ('waiting', 'sent-back', 'published', 'retired'))
);
--> statement-breakpoint
CREATE UNIQUE INDEX `preset_versions_number` ON `preset_versions` (`preset_id`,`number`);--> statement-breakpoint
CREATE INDEX `preset_versions_state` ON `preset_versions` (`state`,`handed_in_at`);--> statement-breakpoint
CREATE INDEX `preset_versions_family` ON `preset_versions` (`family`,`state`);--> statement-breakpoint
CREATE TABLE `presets` (
	`id` text PRIMARY KEY NOT NULL,
	`slug` text NOT NULL,
	`author_id` text,
	`author_name` text NOT NULL,
	`design_id` text,
	`published_version_id` text,
	`created_at` integer NOT NULL,
	`changed_at` integer NOT NULL,
	FOREIGN KEY (`author_id`) REFERENCES `users`(`id`) ON UPDATE no action ON DELETE set null,
	FOREIGN KEY (`design_id`) REFERENCES `designs`(`id`) ON UPDATE no action ON DELETE set null
);
--> statement-breakpoint
CREATE UNIQUE INDEX `presets_slug_unique` ON `presets` (`slug`);--> statement-breakpoint
CREATE INDEX `presets_author` ON `presets` (`author_id`);--> statement-breakpoint
CREATE INDEX `presets_published` ON `presets` (`published_version_id`);--> statement-breakpoint
CREATE TABLE `outbox` (
	`id` text PRIMARY KEY NOT NULL,
	`kind` text NOT NULL,
	`recipient` text NOT NULL,
	`subject` text NOT NULL,
	`text` text NOT NULL,
	`html` text NOT NULL,
	`state` text DEFAULT 'waiting' NOT NULL,
	`attempts` integer DEFAULT 0 NOT NULL,
	`due_at` integer NOT NULL,
	`last_error` text,
	`created_at` integer NOT NULL,
	`sent_at` integer,
	CONSTRAINT "outbox_state" CHECK("outbox"."state" in ('waiting', 'sending', 'sent', 'given-up'))
);
--> statement-breakpoint
CREATE INDEX `outbox_due` ON `outbox` (`state`,`due_at`);--> statement-breakpoint
CREATE TABLE `invitations` (
	`id` text PRIMARY KEY NOT NULL,
	`token_hash` text NOT NULL,
	`email` text NOT NULL,
	`roles` text NOT NULL,
	`invited_by` text,
	`created_at` integer NOT NULL,
	`expires_at` integer NOT NULL,
	`accepted_at` integer,
	`revoked_at` integer,
	FOREIGN KEY (`invited_by`) REFERENCES `users`(`id`) ON UPDATE no action ON DELETE set null
);
--> statement-breakpoint
CREATE UNIQUE INDEX `invitations_token_hash_unique` ON `invitations` (`token_hash`);--> statement-breakpoint
CREATE INDEX `invitations_email` ON `invitations` (`email`);--> statement-breakpoint
CREATE TABLE `mail_tokens` (
	`id` text PRIMARY KEY NOT NULL,
	`purpose` text NOT NULL,
	`user_id` text NOT NULL,
	`email` text NOT NULL,
	`expires_at` integer NOT NULL,
	`used_at` integer,
	`created_at` integer NOT NULL,
	FOREIGN KEY (`user_id`) REFERENCES `users`(`id`) ON UPDATE no action ON DELETE cascade
);
--> statement-breakpoint
CREATE INDEX `mail_tokens_user` ON `mail_tokens` (`user_id`,`purpose`);--> statement-breakpoint
CREATE TABLE `sessions` (
	`id` text PRIMARY KEY NOT NULL,
	`user_id` text NOT NULL,
	`expires_at` integer NOT NULL,
	`created_at` integer NOT NULL,
	`seen_at` integer NOT NULL,
	`user_agent` text NOT NULL,
	FOREIGN KEY (`user_id`) REFERENCES `users`(`id`) ON UPDATE no action ON DELETE cascade
);
--> statement-breakpoint
CREATE INDEX `sessions_user` ON `sessions` (`user_id`);--> statement-breakpoint
CREATE INDEX `sessions_expires` ON `sessions` (`expires_at`);--> statement-breakpoint
CREATE TABLE `user_roles` (
	`user_id` text NOT NULL,
	`role` text NOT NULL,
	PRIMARY KEY(`user_id`, `role`),
	FOREIGN KEY (`user_id`) REFERENCES `users`(`id`) ON UPDATE no action ON DELETE cascade,
	CONSTRAINT "user_roles_role" CHECK("user_roles"."role" in ('member', 'host', 'librarian', 'admin'))
);
--> statement-breakpoint
CREATE TABLE `users` (
	`id` text PRIMARY KEY NOT NULL,
	`email` text NOT NULL,
	`name` text NOT NULL,
	`password_hash` text NOT NULL,
	`email_verified_at` integer,
	`suspended_at` integer,
	`created_at` integer NOT NULL,
	CONSTRAINT "users_email_lower" CHECK("users"."email" = lower("users"."email"))
);
--> statement-breakpoint
CREATE UNIQUE INDEX `users_email_unique` ON `users` (`email`);