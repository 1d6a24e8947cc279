/**
 * The library of parts. Text search is a trigram index, so that any three letters in a row are found wherever they
 * stand; it keeps no copy of the text, and triggers follow every change. A migration that rebuilds the part table must
 * drop the search table and its triggers first and make them again afterwards.
 */
export const PARTS = [
  `CREATE TABLE "part" (
    "id" integer PRIMARY KEY AUTOINCREMENT NOT NULL,
    "number" text COLLATE NOCASE NOT NULL,
    "kind" text NOT NULL,
    "description" text COLLATE NOCASE NOT NULL,
    "standing" text NOT NULL,
    "successorNumber" text COLLATE NOCASE,
    "material" text COLLATE NOCASE,
    "mass" real,
    "supply" text NOT NULL,
    "supplier" text,
    "note" text NOT NULL,
    "attributes" text NOT NULL,
    "teeth" integer,
    "module" real,
    "pressureAngleDeg" real,
    "helixAngleDeg" real,
    "hand" text,
    "profileShift" real,
    "faceWidth" real,
    "bore" real,
    "shaftDiameter" real,
    "length" real,
    "width" real,
    "height" real,
    "version" integer NOT NULL,
    "createdAt" text NOT NULL,
    "updatedAt" text NOT NULL,
    "updatedBy" text NOT NULL
  )`,
  `CREATE UNIQUE INDEX "part_number_unique" ON "part" ("number")`,
  `CREATE INDEX "part_description" ON "part" ("description")`,
  `CREATE INDEX "part_successor" ON "part" ("successorNumber")`,
  `CREATE INDEX "part_material" ON "part" ("material")`,
  `CREATE INDEX "part_mass" ON "part" ("mass")`,
  `CREATE INDEX "part_teeth" ON "part" ("teeth")`,
  `CREATE INDEX "part_module" ON "part" ("module")`,
  `CREATE INDEX "part_face_width" ON "part" ("faceWidth")`,
  `CREATE INDEX "part_bore" ON "part" ("bore")`,
  `CREATE INDEX "part_updated" ON "part" ("updatedAt")`,
  `CREATE INDEX "part_standing_number" ON "part" ("standing", "number")`,
  `CREATE INDEX "part_standing_updated" ON "part" ("standing", "updatedAt")`,
  `CREATE INDEX "part_kind_number" ON "part" ("kind", "number")`,
  `CREATE INDEX "part_kind_tooth" ON "part" ("kind", "module", "teeth")`,
  `CREATE INDEX "part_kind_bore" ON "part" ("kind", "bore")`,
  `CREATE INDEX "part_kind_shaft" ON "part" ("kind", "shaftDiameter")`,
  `CREATE TABLE "part_number_series" ("prefix" text PRIMARY KEY NOT NULL, "last" integer NOT NULL)`,
  `CREATE VIRTUAL TABLE "part_search"
    USING fts5("number", "description", content='part', content_rowid='id', tokenize='trigram')`,
  `CREATE TRIGGER "part_search_insert" AFTER INSERT ON "part" BEGIN
    INSERT INTO "part_search"("rowid", "number", "description")
      VALUES (new."id", new."number", new."description");
  END`,
  `CREATE TRIGGER "part_search_delete" AFTER DELETE ON "part" BEGIN
    INSERT INTO "part_search"("part_search", "rowid", "number", "description")
      VALUES ('delete', old."id", old."number", old."description");
  END`,
  `CREATE TRIGGER "part_search_update" AFTER UPDATE OF "number", "description" ON "part" BEGIN
    INSERT INTO "part_search"("part_search", "rowid", "number", "description")
      VALUES ('delete', old."id", old."number", old."description");
    INSERT INTO "part_search"("rowid", "number", "description")
      VALUES (new."id", new."number", new."description");
  END`,
];

/** In the order they are dropped; the triggers go with the part table. */
export const PARTS_TABLES = ['part_search', 'part_number_series', 'part'];
