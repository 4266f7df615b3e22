CREATE TABLE `estimate_lines` (
	`id` text PRIMARY KEY NOT NULL,
	`estimate_id` text NOT NULL,
	`room_id` text,
	`item_key` text,
	`system` text NOT NULL,
	`trade` text NOT NULL,
	`description` text NOT NULL,
	`unit` text NOT NULL,
	`quantity` text NOT NULL,
	`waste_percent` real NOT NULL,
	`package_size` real,
	`basis` text NOT NULL,
	`override` text,
	`minimum_charge_cents` integer NOT NULL,
	`hours_per_unit` real NOT NULL,
	`evidence` text NOT NULL,
	`note` text NOT NULL,
	`book_materials` text,
	`book_installed` text,
	`position` integer NOT NULL,
	`version` integer DEFAULT 1 NOT NULL,
	`created_at` text NOT NULL,
	`updated_at` text NOT NULL,
	`removed_at` text,
	`removed_with_room_id` text,
	FOREIGN KEY (`estimate_id`) REFERENCES `estimates`(`id`) ON UPDATE no action ON DELETE cascade,
	FOREIGN KEY (`room_id`) REFERENCES `rooms`(`id`) ON UPDATE no action ON DELETE restrict
);
--> statement-breakpoint
CREATE INDEX `estimate_lines_estimate_position` ON `estimate_lines` (`estimate_id`,`removed_at`,`position`);--> statement-breakpoint
CREATE INDEX `estimate_lines_room` ON `estimate_lines` (`room_id`);--> statement-breakpoint
CREATE TABLE `estimates` (
	`id` text PRIMARY KEY NOT NULL,
	`house_id` text NOT NULL,
	`name` text NOT NULL,
	`version` integer DEFAULT 1 NOT NULL,
	`price_book_version` integer NOT NULL,
	`region_key` text NOT NULL,
	`settings` text NOT NULL,
	`unknowns` text NOT NULL,
	`inspections` text NOT NULL,
	`totals` text NOT NULL,
	`error_count` integer NOT NULL,
	`created_at` text NOT NULL,
	`updated_at` text NOT NULL,
	FOREIGN KEY (`house_id`) REFERENCES `houses`(`id`) ON UPDATE no action ON DELETE cascade,
	FOREIGN KEY (`price_book_version`) REFERENCES `price_book_versions`(`version`) ON UPDATE no action ON DELETE restrict
);
--> statement-breakpoint
CREATE INDEX `estimates_house` ON `estimates` (`house_id`,`created_at`);--> statement-breakpoint
CREATE TABLE `houses` (
	`id` text PRIMARY KEY NOT NULL,
	`name` text NOT NULL,
	`address` text NOT NULL,
	`region_key` text NOT NULL,
	`year_built` integer,
	`storeys` real NOT NULL,
	`kind` text NOT NULL,
	`footprint` text,
	`wall_height_in` real,
	`overhang_in` real,
	`roof` text NOT NULL,
	`note` text NOT NULL,
	`version` integer DEFAULT 1 NOT NULL,
	`created_at` text NOT NULL,
	`updated_at` text NOT NULL,
	`removed_at` text
);
--> statement-breakpoint
CREATE INDEX `houses_removed` ON `houses` (`removed_at`);--> statement-breakpoint
CREATE TABLE `house_shares` (
	`house_id` text NOT NULL,
	`user_id` text NOT NULL,
	`shared_by_id` text,
	`shared_at` text NOT NULL,
	PRIMARY KEY(`house_id`, `user_id`),
	FOREIGN KEY (`house_id`) REFERENCES `houses`(`id`) ON UPDATE no action ON DELETE cascade,
	FOREIGN KEY (`user_id`) REFERENCES `users`(`id`) ON UPDATE no action ON DELETE cascade,
	FOREIGN KEY (`shared_by_id`) REFERENCES `users`(`id`) ON UPDATE no action ON DELETE set null
);
--> statement-breakpoint
CREATE INDEX `house_shares_user` ON `house_shares` (`user_id`,`house_id`);--> statement-breakpoint
CREATE TABLE `price_book_versions` (
	`version` integer PRIMARY KEY NOT NULL,
	`status` text NOT NULL,
	`note` text NOT NULL,
	`effective_date` text,
	`created_at` text NOT NULL,
	`published_at` text,
	`published_by` text
);
--> statement-breakpoint
CREATE UNIQUE INDEX `price_book_versions_one_draft` ON `price_book_versions` (`status`) WHERE "price_book_versions"."status" = 'draft';--> statement-breakpoint
CREATE TABLE `price_items` (
	`id` integer PRIMARY KEY AUTOINCREMENT NOT NULL,
	`key` text NOT NULL,
	`region_key` text,
	`from_version` integer NOT NULL,
	`until_version` integer,
	`is_dropped` integer DEFAULT false NOT NULL,
	`row_version` integer NOT NULL,
	`name` text NOT NULL,
	`system` text NOT NULL,
	`trade` text NOT NULL,
	`unit` text NOT NULL,
	`uniformat` text NOT NULL,
	`materials_low_e4` integer,
	`materials_likely_e4` integer,
	`materials_high_e4` integer,
	`installed_low_e4` integer,
	`installed_likely_e4` integer,
	`installed_high_e4` integer,
	`labor_share_percent` real NOT NULL,
	`waste_percent` real NOT NULL,
	`package_size` real,
	`package_name` text NOT NULL,
	`minimum_charge_cents` integer NOT NULL,
	`hours_per_unit` real NOT NULL,
	`room_formula` text,
	`house_formula` text,
	`price_date` text NOT NULL,
	`note` text NOT NULL,
	`search_words` text NOT NULL,
	FOREIGN KEY (`from_version`) REFERENCES `price_book_versions`(`version`) ON UPDATE no action ON DELETE restrict
);
--> statement-breakpoint
CREATE INDEX `price_items_version` ON `price_items` (`region_key`,`from_version`,`until_version`);--> statement-breakpoint
CREATE UNIQUE INDEX `price_items_key` ON `price_items` (`key`,`from_version`) WHERE "price_items"."region_key" is null;--> statement-breakpoint
CREATE UNIQUE INDEX `price_items_region_key` ON `price_items` (`key`,`region_key`,`from_version`);--> statement-breakpoint
CREATE INDEX `price_items_until` ON `price_items` (`until_version`);--> statement-breakpoint
CREATE TABLE `price_regions` (
	`id` integer PRIMARY KEY AUTOINCREMENT NOT NULL,
	`key` text NOT NULL,
	`from_version` integer NOT NULL,
	`until_version` integer,
	`row_version` integer NOT NULL,
	`name` text NOT NULL,
	`materials_factor` real NOT NULL,
	`labor_factor` real NOT NULL,
	`sales_tax_rule` text NOT NULL,
	`sales_tax_percent` real NOT NULL,
	FOREIGN KEY (`from_version`) REFERENCES `price_book_versions`(`version`) ON UPDATE no action ON DELETE restrict
);
--> statement-breakpoint
CREATE INDEX `price_regions_version` ON `price_regions` (`from_version`,`until_version`);--> statement-breakpoint
CREATE UNIQUE INDEX `price_regions_key` ON `price_regions` (`key`,`from_version`);--> statement-breakpoint
CREATE TABLE `rooms` (
	`id` text PRIMARY KEY NOT NULL,
	`house_id` text NOT NULL,
	`name` text NOT NULL,
	`use` text NOT NULL,
	`shape` text NOT NULL,
	`ceiling` text,
	`openings` text NOT NULL,
	`deductions` text NOT NULL,
	`note` text NOT NULL,
	`position` integer NOT NULL,
	`version` integer DEFAULT 1 NOT NULL,
	`created_at` text NOT NULL,
	`updated_at` text NOT NULL,
	`removed_at` text,
	FOREIGN KEY (`house_id`) REFERENCES `houses`(`id`) ON UPDATE no action ON DELETE cascade
);
--> statement-breakpoint
CREATE INDEX `rooms_house_position` ON `rooms` (`house_id`,`removed_at`,`position`);