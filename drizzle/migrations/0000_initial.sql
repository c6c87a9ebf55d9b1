CREATE TABLE `audit_entry` (
	`id` varchar(26) character set ascii collate ascii_bin NOT NULL,
	`at` datetime(3) NOT NULL,
	`person_id` varchar(26) character set ascii collate ascii_bin,
	`person_name` varchar(120) NOT NULL,
	`verb` varchar(80) character set utf8mb4 collate utf8mb4_bin NOT NULL,
	`object_type` varchar(40) character set utf8mb4 collate utf8mb4_bin NOT NULL,
	`object_id` varchar(26) character set ascii collate ascii_bin NOT NULL,
	`object_name` varchar(200) NOT NULL,
	`before_state` longtext,
	`after_state` longtext,
	`note` varchar(1000),
	`request_id` varchar(40) character set utf8mb4 collate utf8mb4_bin NOT NULL DEFAULT '',
	CONSTRAINT `audit_entry_id` PRIMARY KEY(`id`)
);
--> statement-breakpoint
CREATE TABLE `intake` (
	`id` varchar(26) character set ascii collate ascii_bin NOT NULL,
	`file_name` varchar(200) NOT NULL,
	`digest` varchar(64) character set utf8mb4 collate utf8mb4_bin NOT NULL,
	`bytes` int unsigned NOT NULL,
	`format` enum('csv','votable') NOT NULL,
	`storage_key` varchar(200) character set utf8mb4 collate utf8mb4_bin NOT NULL,
	`mapping` longtext NOT NULL,
	`source_id` varchar(26) character set ascii collate ascii_bin,
	`state` enum('uploaded','applied','abandoned') NOT NULL DEFAULT 'uploaded',
	`row_count` int NOT NULL DEFAULT 0,
	`created_count` int NOT NULL DEFAULT 0,
	`updated_count` int NOT NULL DEFAULT 0,
	`same_count` int NOT NULL DEFAULT 0,
	`bad_count` int NOT NULL DEFAULT 0,
	`created_by` varchar(26) character set ascii collate ascii_bin NOT NULL,
	`created_at` datetime(3) NOT NULL,
	`applied_at` datetime(3),
	`version` int NOT NULL DEFAULT 1,
	CONSTRAINT `intake_id` PRIMARY KEY(`id`)
);
--> statement-breakpoint
CREATE TABLE `measurement` (
	`id` varchar(26) character set ascii collate ascii_bin NOT NULL,
	`record_id` varchar(26) character set ascii collate ascii_bin NOT NULL,
	`quantity` enum('parallax','proper-motion-ra','proper-motion-dec','radial-velocity','magnitude-v','colour-bv') NOT NULL,
	`raw_text` varchar(200) character set utf8mb4 collate utf8mb4_bin NOT NULL,
	`value` varchar(64) character set utf8mb4 collate utf8mb4_bin NOT NULL,
	`error` varchar(64) character set utf8mb4 collate utf8mb4_bin,
	`unit` varchar(24) character set utf8mb4 collate utf8mb4_bin NOT NULL,
	`value_canonical` double NOT NULL,
	`error_canonical` double,
	`epoch` varchar(64) character set utf8mb4 collate utf8mb4_bin,
	`source_id` varchar(26) character set ascii collate ascii_bin,
	`locator` varchar(200),
	`from_memory` boolean NOT NULL DEFAULT false,
	`note` varchar(1000),
	`state` enum('proposed','vetted','rejected','superseded') NOT NULL DEFAULT 'proposed',
	`state_reason` varchar(1000),
	`entered_by` varchar(26) character set ascii collate ascii_bin NOT NULL,
	`intake_id` varchar(26) character set ascii collate ascii_bin,
	`created_at` datetime(3) NOT NULL,
	`version` int NOT NULL DEFAULT 1,
	CONSTRAINT `measurement_id` PRIMARY KEY(`id`)
);
--> statement-breakpoint
CREATE TABLE `record` (
	`id` varchar(26) character set ascii collate ascii_bin NOT NULL,
	`kind` enum('star','star-cluster','galaxy','solar-system-body','other') NOT NULL,
	`name` varchar(120) NOT NULL,
	`state` enum('draft','vetted') NOT NULL DEFAULT 'draft',
	`ra_text` varchar(40) character set utf8mb4 collate utf8mb4_bin,
	`dec_text` varchar(40) character set utf8mb4 collate utf8mb4_bin,
	`ra_deg` double,
	`dec_deg` double,
	`position_epoch` varchar(64) character set utf8mb4 collate utf8mb4_bin,
	`position_source_id` varchar(26) character set ascii collate ascii_bin,
	`position_locator` varchar(200),
	`position_note` varchar(500),
	`adopted_parallax_id` varchar(26) character set ascii collate ascii_bin,
	`adopted_reason` varchar(1000),
	`adopted_by` varchar(26) character set ascii collate ascii_bin,
	`adopted_at` datetime(3),
	`prior` enum('edsd','uniform-density','uniform-distance'),
	`prior_scale_pc` double,
	`prior_reason` varchar(1000),
	`regime` enum('firm','wide','prior-led'),
	`distance_method` enum('inverse','edsd','uniform-density','uniform-distance'),
	`distance_pc` double,
	`distance_low_pc` double,
	`distance_high_pc` double,
	`vetted_by` varchar(26) character set ascii collate ascii_bin,
	`vetted_at` datetime(3),
	`created_by` varchar(26) character set ascii collate ascii_bin NOT NULL,
	`created_at` datetime(3) NOT NULL,
	`version` int NOT NULL DEFAULT 1,
	CONSTRAINT `record_id` PRIMARY KEY(`id`)
);
--> statement-breakpoint
CREATE TABLE `record_identifier` (
	`id` varchar(26) character set ascii collate ascii_bin NOT NULL,
	`record_id` varchar(26) character set ascii collate ascii_bin NOT NULL,
	`catalogue` varchar(40) character set utf8mb4 collate utf8mb4_bin NOT NULL,
	`value` varchar(60) character set utf8mb4 collate utf8mb4_bin NOT NULL,
	CONSTRAINT `record_identifier_id` PRIMARY KEY(`id`),
	CONSTRAINT `record_identifier_unique` UNIQUE(`catalogue`,`value`)
);
--> statement-breakpoint
CREATE TABLE `record_name` (
	`id` varchar(26) character set ascii collate ascii_bin NOT NULL,
	`record_id` varchar(26) character set ascii collate ascii_bin NOT NULL,
	`name` varchar(120) NOT NULL,
	`language` enum('en','fr'),
	`preferred` boolean NOT NULL DEFAULT false,
	CONSTRAINT `record_name_id` PRIMARY KEY(`id`)
);
--> statement-breakpoint
CREATE TABLE `source` (
	`id` varchar(26) character set ascii collate ascii_bin NOT NULL,
	`designation` varchar(80),
	`title` varchar(400) NOT NULL,
	`authors` varchar(400) NOT NULL,
	`year` int NOT NULL,
	`bibcode` varchar(19) character set utf8mb4 collate utf8mb4_bin,
	`doi` varchar(200) character set utf8mb4 collate utf8mb4_bin,
	`note` text,
	`created_by` varchar(26) character set ascii collate ascii_bin NOT NULL,
	`created_at` datetime(3) NOT NULL,
	`version` int NOT NULL DEFAULT 1,
	CONSTRAINT `source_id` PRIMARY KEY(`id`),
	CONSTRAINT `source_bibcode` UNIQUE(`bibcode`),
	CONSTRAINT `source_doi` UNIQUE(`doi`)
);
--> statement-breakpoint
CREATE TABLE `edition` (
	`id` varchar(26) character set ascii collate ascii_bin NOT NULL,
	`exhibit_id` varchar(26) character set ascii collate ascii_bin NOT NULL,
	`number` int NOT NULL,
	`digest` varchar(64) character set utf8mb4 collate utf8mb4_bin NOT NULL,
	`content` longblob NOT NULL,
	`stills` longtext NOT NULL,
	`seal_id` varchar(26) character set ascii collate ascii_bin NOT NULL,
	`published_by` varchar(26) character set ascii collate ascii_bin NOT NULL,
	`published_at` datetime(3) NOT NULL,
	`note` varchar(1000),
	CONSTRAINT `edition_id` PRIMARY KEY(`id`),
	CONSTRAINT `edition_number` UNIQUE(`exhibit_id`,`number`)
);
--> statement-breakpoint
CREATE TABLE `exhibit` (
	`id` varchar(26) character set ascii collate ascii_bin NOT NULL,
	`slug` varchar(60) character set utf8mb4 collate utf8mb4_bin NOT NULL,
	`title_en` varchar(160) NOT NULL,
	`title_fr` varchar(160),
	`state` enum('draft','submitted','verified','approved') NOT NULL DEFAULT 'draft',
	`created_by` varchar(26) character set ascii collate ascii_bin NOT NULL,
	`created_at` datetime(3) NOT NULL,
	`version` int NOT NULL DEFAULT 1,
	CONSTRAINT `exhibit_id` PRIMARY KEY(`id`),
	CONSTRAINT `exhibit_slug` UNIQUE(`slug`)
);
--> statement-breakpoint
CREATE TABLE `exhibit_contributor` (
	`exhibit_id` varchar(26) character set ascii collate ascii_bin NOT NULL,
	`person_id` varchar(26) character set ascii collate ascii_bin NOT NULL,
	CONSTRAINT `exhibit_contributor_exhibit_id_person_id_pk` PRIMARY KEY(`exhibit_id`,`person_id`)
);
--> statement-breakpoint
CREATE TABLE `scene` (
	`id` varchar(26) character set ascii collate ascii_bin NOT NULL,
	`exhibit_id` varchar(26) character set ascii collate ascii_bin NOT NULL,
	`position` int NOT NULL,
	`title_en` varchar(160) NOT NULL,
	`title_fr` varchar(160),
	`document` longtext NOT NULL,
	`media_id` varchar(26) character set ascii collate ascii_bin,
	`version` int NOT NULL DEFAULT 1,
	CONSTRAINT `scene_id` PRIMARY KEY(`id`)
);
--> statement-breakpoint
CREATE TABLE `scene_cast` (
	`scene_id` varchar(26) character set ascii collate ascii_bin NOT NULL,
	`record_id` varchar(26) character set ascii collate ascii_bin NOT NULL,
	`position` int NOT NULL,
	`labelled` boolean NOT NULL DEFAULT true,
	CONSTRAINT `scene_cast_scene_id_record_id_pk` PRIMARY KEY(`scene_id`,`record_id`)
);
--> statement-breakpoint
CREATE TABLE `scene_figure` (
	`id` varchar(26) character set ascii collate ascii_bin NOT NULL,
	`scene_id` varchar(26) character set ascii collate ascii_bin NOT NULL,
	`figure_key` varchar(40) character set utf8mb4 collate utf8mb4_bin NOT NULL,
	`record_id` varchar(26) character set ascii collate ascii_bin NOT NULL,
	`quantity` enum('distance','light-left') NOT NULL,
	`unit` enum('ly','pc','au','km') NOT NULL,
	`form` enum('value','range','value-and-range') NOT NULL,
	CONSTRAINT `scene_figure_id` PRIMARY KEY(`id`),
	CONSTRAINT `scene_figure_key` UNIQUE(`scene_id`,`figure_key`)
);
--> statement-breakpoint
CREATE TABLE `scene_words` (
	`scene_id` varchar(26) character set ascii collate ascii_bin NOT NULL,
	`language` enum('en','fr') NOT NULL,
	`body` text NOT NULL,
	CONSTRAINT `scene_words_scene_id_language_pk` PRIMARY KEY(`scene_id`,`language`)
);
--> statement-breakpoint
CREATE TABLE `outbox` (
	`id` varchar(26) character set ascii collate ascii_bin NOT NULL,
	`kind` enum('mail') NOT NULL,
	`payload` longtext NOT NULL,
	`created_at` datetime(3) NOT NULL,
	`available_at` datetime(3) NOT NULL,
	`attempts` int NOT NULL DEFAULT 0,
	`last_error` text,
	`done_at` datetime(3),
	`failed_at` datetime(3),
	CONSTRAINT `outbox_id` PRIMARY KEY(`id`)
);
--> statement-breakpoint
CREATE TABLE `kiosk` (
	`id` varchar(26) character set ascii collate ascii_bin NOT NULL,
	`slug` varchar(60) character set utf8mb4 collate utf8mb4_bin NOT NULL,
	`name` varchar(120) NOT NULL,
	`station` varchar(160) NOT NULL,
	`exhibit_id` varchar(26) character set ascii collate ascii_bin,
	`language` enum('en','fr') NOT NULL DEFAULT 'en',
	`idle_seconds` int NOT NULL DEFAULT 60,
	`shown_edition` int,
	`shown_at` datetime(3),
	`created_at` datetime(3) NOT NULL,
	`version` int NOT NULL DEFAULT 1,
	CONSTRAINT `kiosk_id` PRIMARY KEY(`id`),
	CONSTRAINT `kiosk_slug` UNIQUE(`slug`)
);
--> statement-breakpoint
CREATE TABLE `media` (
	`id` varchar(26) character set ascii collate ascii_bin NOT NULL,
	`digest` varchar(64) character set utf8mb4 collate utf8mb4_bin NOT NULL,
	`file_name` varchar(200) NOT NULL,
	`mime` varchar(60) character set utf8mb4 collate utf8mb4_bin NOT NULL,
	`bytes` int unsigned NOT NULL,
	`width` int NOT NULL,
	`height` int NOT NULL,
	`creator` varchar(200) NOT NULL,
	`credit_line` varchar(300) NOT NULL,
	`licence` enum('CC0-1.0','CC-BY-4.0','CC-BY-SA-4.0','public-domain','own-work','by-written-permission') NOT NULL,
	`alt_en` varchar(500) NOT NULL,
	`alt_fr` varchar(500),
	`created_by` varchar(26) character set ascii collate ascii_bin NOT NULL,
	`created_at` datetime(3) NOT NULL,
	`version` int NOT NULL DEFAULT 1,
	CONSTRAINT `media_id` PRIMARY KEY(`id`),
	CONSTRAINT `media_digest` UNIQUE(`digest`)
);
--> statement-breakpoint
CREATE TABLE `media_variant` (
	`id` varchar(26) character set ascii collate ascii_bin NOT NULL,
	`media_id` varchar(26) character set ascii collate ascii_bin NOT NULL,
	`format` enum('avif','webp','jpeg') NOT NULL,
	`width` int NOT NULL,
	`height` int NOT NULL,
	`bytes` int unsigned NOT NULL,
	`digest` varchar(64) character set utf8mb4 collate utf8mb4_bin NOT NULL,
	CONSTRAINT `media_variant_id` PRIMARY KEY(`id`),
	CONSTRAINT `media_variant_size` UNIQUE(`media_id`,`format`,`width`)
);
--> statement-breakpoint
CREATE TABLE `one_time_link` (
	`id` varchar(26) character set ascii collate ascii_bin NOT NULL,
	`token_hash` varchar(64) character set utf8mb4 collate utf8mb4_bin NOT NULL,
	`person_id` varchar(26) character set ascii collate ascii_bin NOT NULL,
	`purpose` enum('invitation','password-reset') NOT NULL,
	`created_at` datetime(3) NOT NULL,
	`expires_at` datetime(3) NOT NULL,
	`used_at` datetime(3),
	CONSTRAINT `one_time_link_id` PRIMARY KEY(`id`),
	CONSTRAINT `one_time_link_token` UNIQUE(`token_hash`)
);
--> statement-breakpoint
CREATE TABLE `person` (
	`id` varchar(26) character set ascii collate ascii_bin NOT NULL,
	`email` varchar(254) NOT NULL,
	`name` varchar(120) NOT NULL,
	`password_hash` varchar(255) character set utf8mb4 collate utf8mb4_bin,
	`state` enum('invited','active','deactivated') NOT NULL DEFAULT 'invited',
	`created_at` datetime(3) NOT NULL,
	`version` int NOT NULL DEFAULT 1,
	CONSTRAINT `person_id` PRIMARY KEY(`id`),
	CONSTRAINT `person_email` UNIQUE(`email`)
);
--> statement-breakpoint
CREATE TABLE `person_role` (
	`person_id` varchar(26) character set ascii collate ascii_bin NOT NULL,
	`role` enum('editor','scientist','publisher','admin') NOT NULL,
	CONSTRAINT `person_role_person_id_role_pk` PRIMARY KEY(`person_id`,`role`)
);
--> statement-breakpoint
CREATE TABLE `session` (
	`id` varchar(26) character set ascii collate ascii_bin NOT NULL,
	`token_hash` varchar(64) character set utf8mb4 collate utf8mb4_bin NOT NULL,
	`person_id` varchar(26) character set ascii collate ascii_bin NOT NULL,
	`created_at` datetime(3) NOT NULL,
	`last_seen_at` datetime(3) NOT NULL,
	`expires_at` datetime(3) NOT NULL,
	`revoked_at` datetime(3),
	`address` varchar(64) NOT NULL DEFAULT '',
	`user_agent` varchar(400) NOT NULL DEFAULT '',
	CONSTRAINT `session_id` PRIMARY KEY(`id`),
	CONSTRAINT `session_token` UNIQUE(`token_hash`)
);
--> statement-breakpoint
CREATE TABLE `seal` (
	`id` varchar(26) character set ascii collate ascii_bin NOT NULL,
	`exhibit_id` varchar(26) character set ascii collate ascii_bin NOT NULL,
	`kind` enum('submitted','verified','approved') NOT NULL,
	`digest` varchar(64) character set utf8mb4 collate utf8mb4_bin NOT NULL,
	`content` longblob NOT NULL,
	`person_id` varchar(26) character set ascii collate ascii_bin NOT NULL,
	`signed_at` datetime(3) NOT NULL,
	`note` varchar(1000),
	`voided_at` datetime(3),
	`void_reason` longtext,
	CONSTRAINT `seal_id` PRIMARY KEY(`id`)
);
--> statement-breakpoint
ALTER TABLE `intake` ADD CONSTRAINT `intake_source_id_source_id_fk` FOREIGN KEY (`source_id`) REFERENCES `source`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `intake` ADD CONSTRAINT `intake_created_by_person_id_fk` FOREIGN KEY (`created_by`) REFERENCES `person`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `measurement` ADD CONSTRAINT `measurement_record_id_record_id_fk` FOREIGN KEY (`record_id`) REFERENCES `record`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `measurement` ADD CONSTRAINT `measurement_source_id_source_id_fk` FOREIGN KEY (`source_id`) REFERENCES `source`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `measurement` ADD CONSTRAINT `measurement_entered_by_person_id_fk` FOREIGN KEY (`entered_by`) REFERENCES `person`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `record` ADD CONSTRAINT `record_position_source_id_source_id_fk` FOREIGN KEY (`position_source_id`) REFERENCES `source`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `record` ADD CONSTRAINT `record_adopted_by_person_id_fk` FOREIGN KEY (`adopted_by`) REFERENCES `person`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `record` ADD CONSTRAINT `record_vetted_by_person_id_fk` FOREIGN KEY (`vetted_by`) REFERENCES `person`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `record` ADD CONSTRAINT `record_created_by_person_id_fk` FOREIGN KEY (`created_by`) REFERENCES `person`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `record_identifier` ADD CONSTRAINT `record_identifier_record_id_record_id_fk` FOREIGN KEY (`record_id`) REFERENCES `record`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `record_name` ADD CONSTRAINT `record_name_record_id_record_id_fk` FOREIGN KEY (`record_id`) REFERENCES `record`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `source` ADD CONSTRAINT `source_created_by_person_id_fk` FOREIGN KEY (`created_by`) REFERENCES `person`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `edition` ADD CONSTRAINT `edition_exhibit_id_exhibit_id_fk` FOREIGN KEY (`exhibit_id`) REFERENCES `exhibit`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `edition` ADD CONSTRAINT `edition_seal_id_seal_id_fk` FOREIGN KEY (`seal_id`) REFERENCES `seal`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `edition` ADD CONSTRAINT `edition_published_by_person_id_fk` FOREIGN KEY (`published_by`) REFERENCES `person`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `exhibit` ADD CONSTRAINT `exhibit_created_by_person_id_fk` FOREIGN KEY (`created_by`) REFERENCES `person`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `exhibit_contributor` ADD CONSTRAINT `exhibit_contributor_exhibit_id_exhibit_id_fk` FOREIGN KEY (`exhibit_id`) REFERENCES `exhibit`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `exhibit_contributor` ADD CONSTRAINT `exhibit_contributor_person_id_person_id_fk` FOREIGN KEY (`person_id`) REFERENCES `person`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `scene` ADD CONSTRAINT `scene_exhibit_id_exhibit_id_fk` FOREIGN KEY (`exhibit_id`) REFERENCES `exhibit`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `scene` ADD CONSTRAINT `scene_media_id_media_id_fk` FOREIGN KEY (`media_id`) REFERENCES `media`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `scene_cast` ADD CONSTRAINT `scene_cast_scene_id_scene_id_fk` FOREIGN KEY (`scene_id`) REFERENCES `scene`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `scene_cast` ADD CONSTRAINT `scene_cast_record_id_record_id_fk` FOREIGN KEY (`record_id`) REFERENCES `record`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `scene_figure` ADD CONSTRAINT `scene_figure_scene_id_scene_id_fk` FOREIGN KEY (`scene_id`) REFERENCES `scene`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `scene_figure` ADD CONSTRAINT `scene_figure_record_id_record_id_fk` FOREIGN KEY (`record_id`) REFERENCES `record`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `scene_words` ADD CONSTRAINT `scene_words_scene_id_scene_id_fk` FOREIGN KEY (`scene_id`) REFERENCES `scene`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `kiosk` ADD CONSTRAINT `kiosk_exhibit_id_exhibit_id_fk` FOREIGN KEY (`exhibit_id`) REFERENCES `exhibit`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `media` ADD CONSTRAINT `media_created_by_person_id_fk` FOREIGN KEY (`created_by`) REFERENCES `person`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `media_variant` ADD CONSTRAINT `media_variant_media_id_media_id_fk` FOREIGN KEY (`media_id`) REFERENCES `media`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `one_time_link` ADD CONSTRAINT `one_time_link_person_id_person_id_fk` FOREIGN KEY (`person_id`) REFERENCES `person`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `person_role` ADD CONSTRAINT `person_role_person_id_person_id_fk` FOREIGN KEY (`person_id`) REFERENCES `person`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `session` ADD CONSTRAINT `session_person_id_person_id_fk` FOREIGN KEY (`person_id`) REFERENCES `person`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `seal` ADD CONSTRAINT `seal_exhibit_id_exhibit_id_fk` FOREIGN KEY (`exhibit_id`) REFERENCES `exhibit`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `seal` ADD CONSTRAINT `seal_person_id_person_id_fk` FOREIGN KEY (`person_id`) REFERENCES `person`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
CREATE INDEX `audit_object` ON `audit_entry` (`object_type`,`object_id`,`id`);--> statement-breakpoint
CREATE INDEX `audit_person` ON `audit_entry` (`person_id`,`id`);--> statement-breakpoint
CREATE INDEX `intake_digest` ON `intake` (`digest`);--> statement-breakpoint
CREATE INDEX `measurement_record` ON `measurement` (`record_id`,`quantity`);--> statement-breakpoint
CREATE INDEX `measurement_source` ON `measurement` (`source_id`);--> statement-breakpoint
CREATE INDEX `record_name_order` ON `record` (`name`,`id`);--> statement-breakpoint
CREATE INDEX `record_distance_order` ON `record` (`distance_pc`,`id`);--> statement-breakpoint
CREATE INDEX `record_state` ON `record` (`state`,`id`);--> statement-breakpoint
CREATE INDEX `record_identifier_record` ON `record_identifier` (`record_id`);--> statement-breakpoint
CREATE INDEX `record_identifier_value` ON `record_identifier` (`value`);--> statement-breakpoint
CREATE INDEX `record_name_record` ON `record_name` (`record_id`);--> statement-breakpoint
CREATE INDEX `record_name_text` ON `record_name` (`name`);--> statement-breakpoint
CREATE INDEX `scene_order` ON `scene` (`exhibit_id`,`position`);--> statement-breakpoint
CREATE INDEX `scene_cast_record` ON `scene_cast` (`record_id`);--> statement-breakpoint
CREATE INDEX `scene_figure_record` ON `scene_figure` (`record_id`);--> statement-breakpoint
CREATE INDEX `outbox_due` ON `outbox` (`done_at`,`failed_at`,`available_at`);--> statement-breakpoint
CREATE INDEX `kiosk_exhibit` ON `kiosk` (`exhibit_id`);--> statement-breakpoint
CREATE INDEX `media_variant_digest` ON `media_variant` (`digest`);--> statement-breakpoint
CREATE INDEX `one_time_link_person` ON `one_time_link` (`person_id`,`purpose`);--> statement-breakpoint
CREATE INDEX `session_person` ON `session` (`person_id`);--> statement-breakpoint
CREATE INDEX `seal_exhibit` ON `seal` (`exhibit_id`,`id`);