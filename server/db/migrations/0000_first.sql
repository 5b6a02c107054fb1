CREATE TABLE `estimate_lines` (
	`id` integer PRIMARY KEY AUTOINCREMENT NOT NULL,
	`estimate_id` integer NOT NULL,
	`version` integer DEFAULT 1 NOT NULL,
	`stage` text NOT NULL,
	`position` integer NOT NULL,
	`kind` text NOT NULL,
	`description` text NOT NULL,
	`hours_low_hundredths` integer,
	`hours_likely_hundredths` integer,
	`hours_high_hundredths` integer,
	`rate_cents` integer,
	`quantity_thousandths` integer,
	`unit_cost_ten_thousandths` integer,
	`quote_cents` integer,
	`markup_ppm` integer,
	FOREIGN KEY (`estimate_id`) REFERENCES `estimates`(`id`) ON UPDATE no action ON DELETE cascade,
	CONSTRAINT "estimate_lines_kind" CHECK(case "estimate_lines"."kind"
        when 'labour' then "estimate_lines"."hours_low_hundredths" >= 0 and "estimate_lines"."hours_low_hundredths" <= "estimate_lines"."hours_likely_hundredths" and "estimate_lines"."hours_likely_hundredths" <= "estimate_lines"."hours_high_hundredths" and "estimate_lines"."rate_cents" >= 0
        when 'part' then "estimate_lines"."quantity_thousandths" >= 0 and "estimate_lines"."unit_cost_ten_thousandths" >= 0 and "estimate_lines"."markup_ppm" >= 0
        when 'outside' then "estimate_lines"."quote_cents" >= 0 and "estimate_lines"."markup_ppm" >= 0
      end is true)
);
--> statement-breakpoint
CREATE INDEX `estimate_lines_estimate` ON `estimate_lines` (`estimate_id`,`stage`,`position`);--> statement-breakpoint
CREATE TABLE `estimates` (
	`id` integer PRIMARY KEY AUTOINCREMENT NOT NULL,
	`set_id` integer NOT NULL,
	`version` integer DEFAULT 1 NOT NULL,
	`title` text NOT NULL,
	`currency` text NOT NULL,
	`labour_rate_cents` integer NOT NULL,
	`parts_markup_ppm` integer NOT NULL,
	`outside_markup_ppm` integer NOT NULL,
	`tax_treatment` text NOT NULL,
	`tax_rate_ppm` integer NOT NULL,
	`tax_note` text DEFAULT '' NOT NULL,
	`deposit_ppm` integer NOT NULL,
	`notes` text DEFAULT '' NOT NULL,
	`archived` integer DEFAULT false NOT NULL,
	`prepared_by` integer NOT NULL,
	`created_at` integer NOT NULL,
	`updated_at` integer NOT NULL,
	FOREIGN KEY (`set_id`) REFERENCES `sets`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`prepared_by`) REFERENCES `users`(`id`) ON UPDATE no action ON DELETE no action,
	CONSTRAINT "estimates_deposit" CHECK("estimates"."deposit_ppm" between 0 and 1000000)
);
--> statement-breakpoint
CREATE INDEX `estimates_set` ON `estimates` (`set_id`);--> statement-breakpoint
CREATE INDEX `estimates_updated` ON `estimates` (`updated_at`);--> statement-breakpoint
CREATE TABLE `owners` (
	`id` integer PRIMARY KEY AUTOINCREMENT NOT NULL,
	`name` text NOT NULL,
	`email` text DEFAULT '' NOT NULL,
	`phone` text DEFAULT '' NOT NULL,
	`user_id` integer,
	`created_at` integer NOT NULL,
	FOREIGN KEY (`user_id`) REFERENCES `users`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE INDEX `owners_user` ON `owners` (`user_id`);--> statement-breakpoint
CREATE TABLE `sessions` (
	`id_hash` text PRIMARY KEY NOT NULL,
	`user_id` integer,
	`data` text NOT NULL,
	`expires_at` integer NOT NULL,
	FOREIGN KEY (`user_id`) REFERENCES `users`(`id`) ON UPDATE no action ON DELETE cascade
);
--> statement-breakpoint
CREATE INDEX `sessions_user` ON `sessions` (`user_id`);--> statement-breakpoint
CREATE INDEX `sessions_expiry` ON `sessions` (`expires_at`);--> statement-breakpoint
CREATE TABLE `users` (
	`id` integer PRIMARY KEY AUTOINCREMENT NOT NULL,
	`name` text NOT NULL,
	`email` text NOT NULL,
	`role` text NOT NULL,
	`password_hash` text,
	`disabled` integer DEFAULT false NOT NULL,
	`invitation_hash` text,
	`invitation_expires_at` integer,
	`last_seen_at` integer,
	`created_at` integer NOT NULL,
	CONSTRAINT "users_role" CHECK("users"."role" in ('administrator', 'restorer', 'appraiser', 'collector')),
	CONSTRAINT "users_email_lower" CHECK("users"."email" = lower("users"."email"))
);
--> statement-breakpoint
CREATE UNIQUE INDEX `users_email` ON `users` (`email`);--> statement-breakpoint
CREATE UNIQUE INDEX `users_invitation_hash` ON `users` (`invitation_hash`);--> statement-breakpoint
CREATE TABLE `practice` (
	`id` integer PRIMARY KEY NOT NULL,
	`version` integer DEFAULT 1 NOT NULL,
	`name` text NOT NULL,
	`address` text DEFAULT '' NOT NULL,
	`phone` text DEFAULT '' NOT NULL,
	`email` text DEFAULT '' NOT NULL,
	`currency` text DEFAULT 'USD' NOT NULL,
	`labour_rate_cents` integer NOT NULL,
	`parts_markup_ppm` integer NOT NULL,
	`outside_markup_ppm` integer NOT NULL,
	`tax_treatment` text NOT NULL,
	`tax_rate_ppm` integer NOT NULL,
	`tax_note` text DEFAULT '' NOT NULL,
	`deposit_ppm` integer NOT NULL,
	`paper_size` text NOT NULL,
	`demo` integer DEFAULT false NOT NULL,
	CONSTRAINT "practice_single" CHECK("practice"."id" = 1),
	CONSTRAINT "practice_deposit" CHECK("practice"."deposit_ppm" between 0 and 1000000),
	CONSTRAINT "practice_amounts" CHECK("practice"."labour_rate_cents" >= 0 and "practice"."parts_markup_ppm" >= 0 and "practice"."outside_markup_ppm" >= 0 and "practice"."tax_rate_ppm" >= 0)
);
--> statement-breakpoint
CREATE TABLE `set_conditions` (
	`id` integer PRIMARY KEY AUTOINCREMENT NOT NULL,
	`set_id` integer NOT NULL,
	`part` text NOT NULL,
	`grade` integer NOT NULL,
	`note` text DEFAULT '' NOT NULL,
	`noted_on` text NOT NULL,
	`recorded_by` integer NOT NULL,
	`recorded_at` integer NOT NULL,
	FOREIGN KEY (`set_id`) REFERENCES `sets`(`id`) ON UPDATE no action ON DELETE cascade,
	FOREIGN KEY (`recorded_by`) REFERENCES `users`(`id`) ON UPDATE no action ON DELETE no action,
	CONSTRAINT "set_conditions_grade" CHECK("set_conditions"."grade" between 1 and 5)
);
--> statement-breakpoint
CREATE INDEX `set_conditions_set` ON `set_conditions` (`set_id`);--> statement-breakpoint
CREATE TABLE `set_hazards` (
	`id` integer PRIMARY KEY AUTOINCREMENT NOT NULL,
	`set_id` integer NOT NULL,
	`hazard` text NOT NULL,
	`volts` integer,
	`note` text DEFAULT '' NOT NULL,
	FOREIGN KEY (`set_id`) REFERENCES `sets`(`id`) ON UPDATE no action ON DELETE cascade
);
--> statement-breakpoint
CREATE UNIQUE INDEX `set_hazards_once` ON `set_hazards` (`set_id`,`hazard`);--> statement-breakpoint
CREATE TABLE `set_photos` (
	`id` integer PRIMARY KEY AUTOINCREMENT NOT NULL,
	`set_id` integer NOT NULL,
	`position` integer NOT NULL,
	`caption` text DEFAULT '' NOT NULL,
	`width` integer NOT NULL,
	`height` integer NOT NULL,
	`large` blob NOT NULL,
	`small` blob NOT NULL,
	`added_by` integer NOT NULL,
	`added_at` integer NOT NULL,
	FOREIGN KEY (`set_id`) REFERENCES `sets`(`id`) ON UPDATE no action ON DELETE cascade,
	FOREIGN KEY (`added_by`) REFERENCES `users`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE INDEX `set_photos_set` ON `set_photos` (`set_id`,`position`);--> statement-breakpoint
CREATE TABLE `set_worths` (
	`id` integer PRIMARY KEY AUTOINCREMENT NOT NULL,
	`set_id` integer NOT NULL,
	`kind` text NOT NULL,
	`amount_cents` integer NOT NULL,
	`low_cents` integer,
	`high_cents` integer,
	`currency` text NOT NULL,
	`value_type` text NOT NULL,
	`effective_on` text NOT NULL,
	`said_by` text NOT NULL,
	`basis` text NOT NULL,
	`recorded_by` integer NOT NULL,
	`recorded_at` integer NOT NULL,
	FOREIGN KEY (`set_id`) REFERENCES `sets`(`id`) ON UPDATE no action ON DELETE cascade,
	FOREIGN KEY (`recorded_by`) REFERENCES `users`(`id`) ON UPDATE no action ON DELETE no action,
	CONSTRAINT "set_worths_amount" CHECK("set_worths"."amount_cents" >= 0),
	CONSTRAINT "set_worths_range" CHECK(("set_worths"."low_cents" is null or "set_worths"."low_cents" <= "set_worths"."amount_cents") and ("set_worths"."high_cents" is null or "set_worths"."high_cents" >= "set_worths"."amount_cents"))
);
--> statement-breakpoint
CREATE INDEX `set_worths_set` ON `set_worths` (`set_id`);--> statement-breakpoint
CREATE TABLE `sets` (
	`id` integer PRIMARY KEY AUTOINCREMENT NOT NULL,
	`version` integer DEFAULT 1 NOT NULL,
	`kind` text NOT NULL,
	`maker` text NOT NULL,
	`model` text NOT NULL,
	`description` text DEFAULT '' NOT NULL,
	`chassis` text DEFAULT '' NOT NULL,
	`serial` text DEFAULT '' NOT NULL,
	`year` integer,
	`owner_id` integer,
	`price_cents` integer,
	`price_currency` text,
	`price_period` text,
	`price_source` text,
	`price_is_public` integer DEFAULT false NOT NULL,
	`provenance` text DEFAULT '' NOT NULL,
	`alterations` text DEFAULT '' NOT NULL,
	`notes` text DEFAULT '' NOT NULL,
	`archived` integer DEFAULT false NOT NULL,
	`created_at` integer NOT NULL,
	`updated_at` integer NOT NULL,
	FOREIGN KEY (`owner_id`) REFERENCES `owners`(`id`) ON UPDATE no action ON DELETE no action,
	CONSTRAINT "sets_year" CHECK("sets"."year" is null or "sets"."year" between 1870 and 2100),
	CONSTRAINT "sets_price_cents" CHECK("sets"."price_cents" is null or "sets"."price_cents" >= 0),
	CONSTRAINT "sets_price_whole" CHECK(("sets"."price_cents" is null) = ("sets"."price_currency" is null) and ("sets"."price_cents" is null) = ("sets"."price_period" is null) and ("sets"."price_cents" is null) = ("sets"."price_source" is null))
);
--> statement-breakpoint
CREATE INDEX `sets_owner` ON `sets` (`owner_id`);--> statement-breakpoint
CREATE INDEX `sets_updated` ON `sets` (`updated_at`);