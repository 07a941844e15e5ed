DROP INDEX `catalogue_entries_kind_name`;--> statement-breakpoint
DROP INDEX `catalogue_entries_kind_type_name`;--> statement-breakpoint
CREATE INDEX `catalogue_entries_search` ON `catalogue_entries` (`kind`,`sort_name`,`id`,`search_tight`,`type`);