CREATE TABLE `material_prices` (
	`material_id` text PRIMARY KEY NOT NULL,
	`per_kg` real NOT NULL,
	`currency` text NOT NULL,
	`as_of` text NOT NULL,
	`source` text NOT NULL,
	`edited_at` integer,
	FOREIGN KEY (`material_id`) REFERENCES `materials`(`id`) ON UPDATE no action ON DELETE cascade,
	CONSTRAINT "material_prices_per_kg" CHECK("material_prices"."per_kg" > 0)
);
--> statement-breakpoint
CREATE TABLE `materials` (
	`id` text PRIMARY KEY NOT NULL,
	`position` integer NOT NULL,
	`process` text NOT NULL,
	`name` text NOT NULL,
	`allowable_once` real,
	`allowable_often` real,
	`modulus` real,
	`service_limit` real,
	`properties` text NOT NULL,
	`edited_at` integer,
	CONSTRAINT "materials_process" CHECK("materials"."process" in ('printed', 'moulded'))
);
--> statement-breakpoint
CREATE INDEX `materials_process_position` ON `materials` (`process`,`position`);