-- A migration as one may come: a column more, and one renamed.
ALTER TABLE structure ADD COLUMN depth_um INTEGER;
ALTER TABLE setting RENAME COLUMN value TO text;
