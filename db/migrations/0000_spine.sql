CREATE TABLE `email_token` (
	`id` text PRIMARY KEY NOT NULL,
	`user_id` text NOT NULL,
	`kind` text NOT NULL,
	`token_hash` text NOT NULL,
	`email` text NOT NULL,
	`expires_at` integer NOT NULL,
	`used_at` integer,
	`created_at` integer NOT NULL,
	FOREIGN KEY (`user_id`) REFERENCES `user`(`id`) ON UPDATE no action ON DELETE cascade
);
--> statement-breakpoint
CREATE UNIQUE INDEX `email_token_hash` ON `email_token` (`token_hash`);--> statement-breakpoint
CREATE INDEX `email_token_user` ON `email_token` (`user_id`,`kind`);--> statement-breakpoint
CREATE TABLE `session` (
	`id` text PRIMARY KEY NOT NULL,
	`user_id` text NOT NULL,
	`expires_at` integer NOT NULL,
	`ends_at` integer NOT NULL,
	`created_at` integer NOT NULL,
	`device` text NOT NULL,
	FOREIGN KEY (`user_id`) REFERENCES `user`(`id`) ON UPDATE no action ON DELETE cascade
);
--> statement-breakpoint
CREATE INDEX `session_user` ON `session` (`user_id`);--> statement-breakpoint
CREATE TABLE `user` (
	`id` text PRIMARY KEY NOT NULL,
	`email` text NOT NULL,
	`name` text NOT NULL,
	`password_hash` text NOT NULL,
	`email_verified_at` integer,
	`disabled_at` integer,
	`created_at` integer NOT NULL
);
--> statement-breakpoint
CREATE UNIQUE INDEX `user_email` ON `user` (`email`);--> statement-breakpoint
CREATE TABLE `audit` (
	`id` text PRIMARY KEY NOT NULL,
	`organisation_id` text,
	`camp_id` text,
	`actor_user_id` text,
	`action` text NOT NULL,
	`subject_id` text NOT NULL,
	`sentence` text NOT NULL,
	`at` integer NOT NULL
);
--> statement-breakpoint
CREATE INDEX `audit_camp` ON `audit` (`camp_id`,`at`);--> statement-breakpoint
CREATE INDEX `audit_organisation` ON `audit` (`organisation_id`,`at`);--> statement-breakpoint
CREATE TABLE `block` (
	`id` text PRIMARY KEY NOT NULL,
	`camp_id` text NOT NULL,
	`starts` text NOT NULL,
	`ends` text NOT NULL,
	`label` text DEFAULT '' NOT NULL,
	FOREIGN KEY (`camp_id`) REFERENCES `camp`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE INDEX `block_camp` ON `block` (`camp_id`,`starts`);--> statement-breakpoint
CREATE TABLE `camp` (
	`id` text PRIMARY KEY NOT NULL,
	`organisation_id` text NOT NULL,
	`slug` text NOT NULL,
	`name` text NOT NULL,
	`summary` text DEFAULT '' NOT NULL,
	`description` text DEFAULT '' NOT NULL,
	`starts_on` text NOT NULL,
	`ends_on` text NOT NULL,
	`time_zone` text NOT NULL,
	`currency` text NOT NULL,
	`venue_name` text DEFAULT '' NOT NULL,
	`venue_address` text DEFAULT '' NOT NULL,
	`capacity` integer NOT NULL,
	`price` integer,
	`refund_terms` text DEFAULT '' NOT NULL,
	`arrival_from` text DEFAULT '14:00' NOT NULL,
	`state` text DEFAULT 'draft' NOT NULL,
	`published_at` integer,
	`closed_at` integer,
	`copied_from` text,
	`version` integer DEFAULT 1 NOT NULL,
	`created_at` integer NOT NULL,
	`updated_at` integer NOT NULL,
	FOREIGN KEY (`organisation_id`) REFERENCES `organisation`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`copied_from`) REFERENCES `camp`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE UNIQUE INDEX `camp_slug` ON `camp` (`slug`);--> statement-breakpoint
CREATE INDEX `camp_organisation` ON `camp` (`organisation_id`);--> statement-breakpoint
CREATE INDEX `camp_public` ON `camp` (`state`,`starts_on`);--> statement-breakpoint
CREATE TABLE `camp_picture` (
	`id` text PRIMARY KEY NOT NULL,
	`camp_id` text NOT NULL,
	`alt` text NOT NULL,
	`width` integer NOT NULL,
	`height` integer NOT NULL,
	`position` integer NOT NULL,
	`created_at` integer NOT NULL,
	FOREIGN KEY (`camp_id`) REFERENCES `camp`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE INDEX `camp_picture_camp` ON `camp_picture` (`camp_id`,`position`);--> statement-breakpoint
CREATE TABLE `instructor` (
	`id` text PRIMARY KEY NOT NULL,
	`camp_id` text NOT NULL,
	`user_id` text,
	`name` text NOT NULL,
	`bio` text DEFAULT '' NOT NULL,
	`position` integer NOT NULL,
	FOREIGN KEY (`camp_id`) REFERENCES `camp`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`user_id`) REFERENCES `user`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE INDEX `instructor_camp` ON `instructor` (`camp_id`,`position`);--> statement-breakpoint
CREATE INDEX `instructor_user` ON `instructor` (`user_id`);--> statement-breakpoint
CREATE TABLE `room` (
	`id` text PRIMARY KEY NOT NULL,
	`camp_id` text NOT NULL,
	`name` text NOT NULL,
	`seats` integer NOT NULL,
	`loudness` text NOT NULL,
	`kit` text DEFAULT '' NOT NULL,
	`position` integer NOT NULL,
	FOREIGN KEY (`camp_id`) REFERENCES `camp`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE INDEX `room_camp` ON `room` (`camp_id`,`position`);--> statement-breakpoint
CREATE TABLE `track` (
	`id` text PRIMARY KEY NOT NULL,
	`camp_id` text NOT NULL,
	`name` text NOT NULL,
	`level` text NOT NULL,
	`gate` text DEFAULT '' NOT NULL,
	`capacity` integer NOT NULL,
	`price` integer,
	`position` integer NOT NULL,
	FOREIGN KEY (`camp_id`) REFERENCES `camp`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE INDEX `track_camp` ON `track` (`camp_id`,`position`);--> statement-breakpoint
CREATE TABLE `scan` (
	`id` text PRIMARY KEY NOT NULL,
	`camp_id` text NOT NULL,
	`registration_id` text,
	`kind` text NOT NULL,
	`source` text NOT NULL,
	`verdict` text NOT NULL,
	`reason` text DEFAULT '' NOT NULL,
	`by_user_id` text NOT NULL,
	`device_at` integer NOT NULL,
	`received_at` integer NOT NULL,
	FOREIGN KEY (`camp_id`) REFERENCES `camp`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`registration_id`) REFERENCES `registration`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`by_user_id`) REFERENCES `user`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE INDEX `scan_camp` ON `scan` (`camp_id`,`received_at`);--> statement-breakpoint
CREATE INDEX `scan_registration` ON `scan` (`registration_id`,`received_at`);--> statement-breakpoint
CREATE TABLE `mail` (
	`id` text PRIMARY KEY NOT NULL,
	`kind` text NOT NULL,
	`to_name` text NOT NULL,
	`to_email` text NOT NULL,
	`payload` text NOT NULL,
	`state` text DEFAULT 'queued' NOT NULL,
	`attempts` integer DEFAULT 0 NOT NULL,
	`next_attempt_at` integer NOT NULL,
	`leased_until` integer,
	`last_error` text,
	`created_at` integer NOT NULL,
	`sent_at` integer
);
--> statement-breakpoint
CREATE INDEX `mail_due` ON `mail` (`state`,`next_attempt_at`);--> statement-breakpoint
CREATE TABLE `ledger` (
	`id` text PRIMARY KEY NOT NULL,
	`posting` text NOT NULL,
	`organisation_id` text NOT NULL,
	`order_id` text NOT NULL,
	`account` text NOT NULL,
	`amount` integer NOT NULL,
	`currency` text NOT NULL,
	`memo` text NOT NULL,
	`cause` text NOT NULL,
	`at` integer NOT NULL,
	FOREIGN KEY (`organisation_id`) REFERENCES `organisation`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`order_id`) REFERENCES `order`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE INDEX `ledger_order` ON `ledger` (`order_id`);--> statement-breakpoint
CREATE INDEX `ledger_organisation` ON `ledger` (`organisation_id`,`at`);--> statement-breakpoint
CREATE UNIQUE INDEX `ledger_once` ON `ledger` (`cause`,`memo`,`account`);--> statement-breakpoint
CREATE TABLE `payment` (
	`id` text PRIMARY KEY NOT NULL,
	`order_id` text NOT NULL,
	`state` text NOT NULL,
	`amount` integer NOT NULL,
	`currency` text NOT NULL,
	`session_id` text,
	`intent_id` text,
	`url` text,
	`created_at` integer NOT NULL,
	`updated_at` integer NOT NULL,
	FOREIGN KEY (`order_id`) REFERENCES `order`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE UNIQUE INDEX `payment_session` ON `payment` (`session_id`);--> statement-breakpoint
CREATE INDEX `payment_order` ON `payment` (`order_id`);--> statement-breakpoint
CREATE INDEX `payment_intent` ON `payment` (`intent_id`);--> statement-breakpoint
CREATE TABLE `payment_event` (
	`id` text PRIMARY KEY NOT NULL,
	`type` text NOT NULL,
	`object_id` text NOT NULL,
	`order_id` text,
	`outcome` text NOT NULL,
	`reason` text DEFAULT '' NOT NULL,
	`received_at` integer NOT NULL
);
--> statement-breakpoint
CREATE INDEX `payment_event_object` ON `payment_event` (`type`,`object_id`);--> statement-breakpoint
CREATE INDEX `payment_event_outcome` ON `payment_event` (`outcome`);--> statement-breakpoint
CREATE TABLE `receipt` (
	`id` text PRIMARY KEY NOT NULL,
	`organisation_id` text NOT NULL,
	`order_id` text NOT NULL,
	`payment_id` text NOT NULL,
	`number` integer NOT NULL,
	`amount` integer NOT NULL,
	`currency` text NOT NULL,
	`issued_at` integer NOT NULL,
	FOREIGN KEY (`organisation_id`) REFERENCES `organisation`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`order_id`) REFERENCES `order`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`payment_id`) REFERENCES `payment`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE UNIQUE INDEX `receipt_number` ON `receipt` (`organisation_id`,`number`);--> statement-breakpoint
CREATE UNIQUE INDEX `receipt_payment` ON `receipt` (`payment_id`);--> statement-breakpoint
CREATE INDEX `receipt_order` ON `receipt` (`order_id`);--> statement-breakpoint
CREATE TABLE `refund` (
	`id` text PRIMARY KEY NOT NULL,
	`order_id` text NOT NULL,
	`payment_id` text NOT NULL,
	`amount` integer NOT NULL,
	`currency` text NOT NULL,
	`state` text NOT NULL,
	`reason` text NOT NULL,
	`provider_refund_id` text,
	`attempts` integer DEFAULT 0 NOT NULL,
	`next_attempt_at` integer NOT NULL,
	`created_at` integer NOT NULL,
	`updated_at` integer NOT NULL,
	FOREIGN KEY (`order_id`) REFERENCES `order`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`payment_id`) REFERENCES `payment`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE INDEX `refund_order` ON `refund` (`order_id`);--> statement-breakpoint
CREATE UNIQUE INDEX `refund_provider` ON `refund` (`provider_refund_id`);--> statement-breakpoint
CREATE INDEX `refund_due` ON `refund` (`state`,`next_attempt_at`);--> statement-breakpoint
CREATE TABLE `draft` (
	`id` text PRIMARY KEY NOT NULL,
	`token_hash` text NOT NULL,
	`camp_id` text NOT NULL,
	`answers` text NOT NULL,
	`order_id` text,
	`created_at` integer NOT NULL,
	`updated_at` integer NOT NULL,
	FOREIGN KEY (`camp_id`) REFERENCES `camp`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE UNIQUE INDEX `draft_token` ON `draft` (`token_hash`,`camp_id`);--> statement-breakpoint
CREATE INDEX `draft_updated` ON `draft` (`updated_at`);--> statement-breakpoint
CREATE TABLE `order` (
	`id` text PRIMARY KEY NOT NULL,
	`organisation_id` text NOT NULL,
	`camp_id` text NOT NULL,
	`reference` text NOT NULL,
	`state` text NOT NULL,
	`payer_user_id` text,
	`payer_name` text NOT NULL,
	`payer_email` text NOT NULL,
	`currency` text NOT NULL,
	`total` integer NOT NULL,
	`refund_terms` text NOT NULL,
	`held_until` integer,
	`confirmed_at` integer,
	`created_at` integer NOT NULL,
	`updated_at` integer NOT NULL,
	FOREIGN KEY (`organisation_id`) REFERENCES `organisation`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`camp_id`) REFERENCES `camp`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`payer_user_id`) REFERENCES `user`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE UNIQUE INDEX `order_reference` ON `order` (`reference`);--> statement-breakpoint
CREATE INDEX `order_camp` ON `order` (`camp_id`,`state`);--> statement-breakpoint
CREATE INDEX `order_payer` ON `order` (`payer_user_id`);--> statement-breakpoint
CREATE INDEX `order_payer_email` ON `order` (`payer_email`);--> statement-breakpoint
CREATE INDEX `order_held` ON `order` (`state`,`held_until`);--> statement-breakpoint
CREATE TABLE `order_line` (
	`id` text PRIMARY KEY NOT NULL,
	`order_id` text NOT NULL,
	`registration_id` text,
	`label` text NOT NULL,
	`quantity` integer NOT NULL,
	`unit` integer NOT NULL,
	`amount` integer NOT NULL,
	`position` integer NOT NULL,
	FOREIGN KEY (`order_id`) REFERENCES `order`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE INDEX `order_line_order` ON `order_line` (`order_id`,`position`);--> statement-breakpoint
CREATE TABLE `registration` (
	`id` text PRIMARY KEY NOT NULL,
	`order_id` text NOT NULL,
	`camp_id` text NOT NULL,
	`track_id` text NOT NULL,
	`attendee_user_id` text,
	`attendee_name` text NOT NULL,
	`attendee_search` text NOT NULL,
	`attendee_email` text NOT NULL,
	`minor` integer NOT NULL,
	`state` text NOT NULL,
	`arrival` text DEFAULT 'expected' NOT NULL,
	`arrived_at` integer,
	`created_at` integer NOT NULL,
	`updated_at` integer NOT NULL,
	FOREIGN KEY (`order_id`) REFERENCES `order`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`camp_id`) REFERENCES `camp`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`track_id`) REFERENCES `track`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`attendee_user_id`) REFERENCES `user`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE INDEX `registration_camp` ON `registration` (`camp_id`,`state`);--> statement-breakpoint
CREATE INDEX `registration_track` ON `registration` (`track_id`,`state`);--> statement-breakpoint
CREATE INDEX `registration_order` ON `registration` (`order_id`);--> statement-breakpoint
CREATE INDEX `registration_search` ON `registration` (`camp_id`,`attendee_search`);--> statement-breakpoint
CREATE INDEX `registration_attendee` ON `registration` (`attendee_user_id`);--> statement-breakpoint
CREATE TABLE `registration_harp` (
	`registration_id` text NOT NULL,
	`harp_id` text NOT NULL,
	PRIMARY KEY(`registration_id`, `harp_id`),
	FOREIGN KEY (`registration_id`) REFERENCES `registration`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE TABLE `registration_needs` (
	`registration_id` text PRIMARY KEY NOT NULL,
	`diet` text DEFAULT '' NOT NULL,
	`access` text DEFAULT '' NOT NULL,
	`emergency_name` text DEFAULT '' NOT NULL,
	`emergency_phone` text DEFAULT '' NOT NULL,
	`guardian_name` text DEFAULT '' NOT NULL,
	`guardian_email` text DEFAULT '' NOT NULL,
	`guardian_phone` text DEFAULT '' NOT NULL,
	`consent_at` integer,
	`consent_text` text DEFAULT '' NOT NULL,
	FOREIGN KEY (`registration_id`) REFERENCES `registration`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE TABLE `registration_workshop` (
	`registration_id` text NOT NULL,
	`workshop_id` text NOT NULL,
	PRIMARY KEY(`registration_id`, `workshop_id`),
	FOREIGN KEY (`registration_id`) REFERENCES `registration`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`workshop_id`) REFERENCES `workshop`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE INDEX `registration_workshop_workshop` ON `registration_workshop` (`workshop_id`);--> statement-breakpoint
CREATE TABLE `ticket` (
	`id` text PRIMARY KEY NOT NULL,
	`registration_id` text NOT NULL,
	`camp_id` text NOT NULL,
	`issued_at` integer NOT NULL,
	`revoked_at` integer,
	FOREIGN KEY (`registration_id`) REFERENCES `registration`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`camp_id`) REFERENCES `camp`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE UNIQUE INDEX `ticket_valid` ON `ticket` (`registration_id`) WHERE revoked_at is null;--> statement-breakpoint
CREATE INDEX `ticket_camp` ON `ticket` (`camp_id`);--> statement-breakpoint
CREATE TABLE `invitation` (
	`id` text PRIMARY KEY NOT NULL,
	`organisation_id` text NOT NULL,
	`email` text NOT NULL,
	`role` text NOT NULL,
	`token_hash` text NOT NULL,
	`invited_by` text NOT NULL,
	`expires_at` integer NOT NULL,
	`accepted_at` integer,
	`revoked_at` integer,
	`created_at` integer NOT NULL,
	FOREIGN KEY (`organisation_id`) REFERENCES `organisation`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`invited_by`) REFERENCES `user`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE UNIQUE INDEX `invitation_token` ON `invitation` (`token_hash`);--> statement-breakpoint
CREATE INDEX `invitation_organisation` ON `invitation` (`organisation_id`);--> statement-breakpoint
CREATE TABLE `membership` (
	`id` text PRIMARY KEY NOT NULL,
	`organisation_id` text NOT NULL,
	`user_id` text NOT NULL,
	`role` text NOT NULL,
	`created_at` integer NOT NULL,
	`revoked_at` integer,
	FOREIGN KEY (`organisation_id`) REFERENCES `organisation`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`user_id`) REFERENCES `user`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE INDEX `membership_user` ON `membership` (`user_id`,`revoked_at`);--> statement-breakpoint
CREATE INDEX `membership_organisation` ON `membership` (`organisation_id`,`role`);--> statement-breakpoint
CREATE TABLE `organisation` (
	`id` text PRIMARY KEY NOT NULL,
	`slug` text NOT NULL,
	`name` text NOT NULL,
	`email` text NOT NULL,
	`created_at` integer NOT NULL
);
--> statement-breakpoint
CREATE UNIQUE INDEX `organisation_slug` ON `organisation` (`slug`);--> statement-breakpoint
CREATE TABLE `harp_need` (
	`id` text PRIMARY KEY NOT NULL,
	`workshop_id` text NOT NULL,
	`level` text NOT NULL,
	`any_of` text NOT NULL,
	`note` text DEFAULT '' NOT NULL,
	`position` integer NOT NULL,
	FOREIGN KEY (`workshop_id`) REFERENCES `workshop`(`id`) ON UPDATE no action ON DELETE cascade
);
--> statement-breakpoint
CREATE INDEX `harp_need_workshop` ON `harp_need` (`workshop_id`,`position`);--> statement-breakpoint
CREATE TABLE `meeting` (
	`id` text PRIMARY KEY NOT NULL,
	`camp_id` text NOT NULL,
	`workshop_id` text NOT NULL,
	`room_id` text NOT NULL,
	`day` text NOT NULL,
	`starts` text NOT NULL,
	`length_minutes` integer NOT NULL,
	`sequence` integer DEFAULT 0 NOT NULL,
	`updated_at` integer NOT NULL,
	FOREIGN KEY (`camp_id`) REFERENCES `camp`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`workshop_id`) REFERENCES `workshop`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`room_id`) REFERENCES `room`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE INDEX `meeting_camp` ON `meeting` (`camp_id`,`day`,`starts`);--> statement-breakpoint
CREATE INDEX `meeting_workshop` ON `meeting` (`workshop_id`);--> statement-breakpoint
CREATE INDEX `meeting_room` ON `meeting` (`room_id`,`day`);--> statement-breakpoint
CREATE TABLE `workshop` (
	`id` text PRIMARY KEY NOT NULL,
	`camp_id` text NOT NULL,
	`title` text NOT NULL,
	`description` text DEFAULT '' NOT NULL,
	`kind` text NOT NULL,
	`audience` text NOT NULL,
	`length_minutes` integer NOT NULL,
	`capacity` integer,
	FOREIGN KEY (`camp_id`) REFERENCES `camp`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE INDEX `workshop_camp` ON `workshop` (`camp_id`);--> statement-breakpoint
CREATE TABLE `workshop_instructor` (
	`workshop_id` text NOT NULL,
	`instructor_id` text NOT NULL,
	PRIMARY KEY(`workshop_id`, `instructor_id`),
	FOREIGN KEY (`workshop_id`) REFERENCES `workshop`(`id`) ON UPDATE no action ON DELETE cascade,
	FOREIGN KEY (`instructor_id`) REFERENCES `instructor`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE INDEX `workshop_instructor_instructor` ON `workshop_instructor` (`instructor_id`);--> statement-breakpoint
CREATE TABLE `workshop_track` (
	`workshop_id` text NOT NULL,
	`track_id` text NOT NULL,
	PRIMARY KEY(`workshop_id`, `track_id`),
	FOREIGN KEY (`workshop_id`) REFERENCES `workshop`(`id`) ON UPDATE no action ON DELETE cascade,
	FOREIGN KEY (`track_id`) REFERENCES `track`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE INDEX `workshop_track_track` ON `workshop_track` (`track_id`);