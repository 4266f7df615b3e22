-- A published version of the price book never changes. What may still happen to a published row is that a later version ends it.
CREATE TRIGGER price_items_keep_published BEFORE UPDATE ON price_items
WHEN (SELECT status FROM price_book_versions WHERE version = OLD.from_version) = 'published'
  AND NOT (
    OLD.until_version IS NULL
    AND NEW.until_version > (SELECT max(version) FROM price_book_versions WHERE status = 'published')
    AND NEW.id IS OLD.id AND NEW.key IS OLD.key AND NEW.region_key IS OLD.region_key AND NEW.from_version IS OLD.from_version
    AND NEW.is_dropped IS OLD.is_dropped AND NEW.row_version IS OLD.row_version AND NEW.name IS OLD.name AND NEW.system IS OLD.system
    AND NEW.trade IS OLD.trade AND NEW.unit IS OLD.unit AND NEW.uniformat IS OLD.uniformat
    AND NEW.materials_low_e4 IS OLD.materials_low_e4 AND NEW.materials_likely_e4 IS OLD.materials_likely_e4
    AND NEW.materials_high_e4 IS OLD.materials_high_e4 AND NEW.installed_low_e4 IS OLD.installed_low_e4
    AND NEW.installed_likely_e4 IS OLD.installed_likely_e4 AND NEW.installed_high_e4 IS OLD.installed_high_e4
    AND NEW.labor_share_percent IS OLD.labor_share_percent AND NEW.waste_percent IS OLD.waste_percent
    AND NEW.package_size IS OLD.package_size AND NEW.package_name IS OLD.package_name
    AND NEW.minimum_charge_cents IS OLD.minimum_charge_cents AND NEW.hours_per_unit IS OLD.hours_per_unit
    AND NEW.room_formula IS OLD.room_formula AND NEW.house_formula IS OLD.house_formula
    AND NEW.price_date IS OLD.price_date AND NEW.note IS OLD.note AND NEW.search_words IS OLD.search_words
  )
BEGIN
  SELECT raise(ABORT, 'a published price item never changes');
END;
--> statement-breakpoint
CREATE TRIGGER price_items_keep_published_rows BEFORE DELETE ON price_items
WHEN (SELECT status FROM price_book_versions WHERE version = OLD.from_version) = 'published'
BEGIN
  SELECT raise(ABORT, 'a published price item is never deleted');
END;
--> statement-breakpoint
CREATE TRIGGER price_items_join_drafts_alone BEFORE INSERT ON price_items
WHEN (SELECT status FROM price_book_versions WHERE version = NEW.from_version) = 'published'
BEGIN
  SELECT raise(ABORT, 'a published version takes no new price item');
END;
--> statement-breakpoint
CREATE TRIGGER price_regions_keep_published BEFORE UPDATE ON price_regions
WHEN (SELECT status FROM price_book_versions WHERE version = OLD.from_version) = 'published'
  AND NOT (
    OLD.until_version IS NULL
    AND NEW.until_version > (SELECT max(version) FROM price_book_versions WHERE status = 'published')
    AND NEW.id IS OLD.id AND NEW.key IS OLD.key AND NEW.from_version IS OLD.from_version AND NEW.row_version IS OLD.row_version
    AND NEW.name IS OLD.name AND NEW.materials_factor IS OLD.materials_factor AND NEW.labor_factor IS OLD.labor_factor
    AND NEW.sales_tax_rule IS OLD.sales_tax_rule AND NEW.sales_tax_percent IS OLD.sales_tax_percent
  )
BEGIN
  SELECT raise(ABORT, 'a published price region never changes');
END;
--> statement-breakpoint
CREATE TRIGGER price_regions_keep_published_rows BEFORE DELETE ON price_regions
WHEN (SELECT status FROM price_book_versions WHERE version = OLD.from_version) = 'published'
BEGIN
  SELECT raise(ABORT, 'a published price region is never deleted');
END;
--> statement-breakpoint
CREATE TRIGGER price_regions_join_drafts_alone BEFORE INSERT ON price_regions
WHEN (SELECT status FROM price_book_versions WHERE version = NEW.from_version) = 'published'
BEGIN
  SELECT raise(ABORT, 'a published version takes no new price region');
END;
--> statement-breakpoint
CREATE TRIGGER price_book_versions_keep_published BEFORE UPDATE ON price_book_versions
WHEN OLD.status = 'published'
BEGIN
  SELECT raise(ABORT, 'a published version never changes');
END;
--> statement-breakpoint
CREATE TRIGGER price_book_versions_keep_published_rows BEFORE DELETE ON price_book_versions
WHEN OLD.status = 'published'
BEGIN
  SELECT raise(ABORT, 'a published version is never deleted');
END;
--> statement-breakpoint
-- Words of the price items by their beginnings. Triggers keep it, so that no way of writing an item can forget it.
CREATE VIRTUAL TABLE price_items_search USING fts5(
  name, search_words, content = 'price_items', content_rowid = 'id', prefix = '1 2 3', tokenize = 'unicode61 remove_diacritics 2'
);
--> statement-breakpoint
-- A word in the name counts for more than one in the note. Kept with the index, so that it can give its best matches first without sorting all.
INSERT INTO price_items_search (price_items_search, rank) VALUES ('rank', 'bm25(8.0, 1.0)');
--> statement-breakpoint
CREATE TRIGGER price_items_search_insert AFTER INSERT ON price_items BEGIN
  INSERT INTO price_items_search (rowid, name, search_words) VALUES (NEW.id, NEW.name, NEW.search_words);
END;
--> statement-breakpoint
CREATE TRIGGER price_items_search_delete AFTER DELETE ON price_items BEGIN
  INSERT INTO price_items_search (price_items_search, rowid, name, search_words) VALUES ('delete', OLD.id, OLD.name, OLD.search_words);
END;
--> statement-breakpoint
CREATE TRIGGER price_items_search_update AFTER UPDATE OF name, search_words ON price_items BEGIN
  INSERT INTO price_items_search (price_items_search, rowid, name, search_words) VALUES ('delete', OLD.id, OLD.name, OLD.search_words);
  INSERT INTO price_items_search (rowid, name, search_words) VALUES (NEW.id, NEW.name, NEW.search_words);
END;
