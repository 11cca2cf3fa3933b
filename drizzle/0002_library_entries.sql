CREATE TABLE `library_entries` (
	`row` integer PRIMARY KEY AUTOINCREMENT NOT NULL,
	`preset_id` text NOT NULL,
	`version_id` text NOT NULL,
	`slug` text NOT NULL,
	`author` text NOT NULL,
	`title` text NOT NULL,
	`purpose` text NOT NULL,
	`notes` text NOT NULL,
	`tags` text NOT NULL,
	`family` text NOT NULL,
	`kind` text NOT NULL,
	`material` text NOT NULL,
	`verdict` text NOT NULL,
	`strain_share` real,
	`longest` real NOT NULL,
	`enclosure` text,
	`facets` text NOT NULL,
	`worked` integer NOT NULL,
	`failed` integer NOT NULL,
	`favourites` integer NOT NULL,
	`published_at` integer NOT NULL,
	FOREIGN KEY (`preset_id`) REFERENCES `presets`(`id`) ON UPDATE no action ON DELETE cascade
);
--> statement-breakpoint
CREATE UNIQUE INDEX `library_entries_preset_id_unique` ON `library_entries` (`preset_id`);--> statement-breakpoint
CREATE INDEX `library_entries_worked` ON `library_entries` (`worked`,`row`);--> statement-breakpoint
CREATE INDEX `library_entries_favourites` ON `library_entries` (`favourites`,`row`);--> statement-breakpoint
CREATE INDEX `library_entries_title` ON `library_entries` (`title`,`row`);--> statement-breakpoint
ALTER TABLE `design_states` ADD `begun_at` integer NOT NULL;