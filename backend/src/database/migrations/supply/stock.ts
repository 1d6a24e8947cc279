/**
 * The stock ledger. Movements are only ever added. Each one brings the level of its part and place up to date by
 * itself, and a level that is not the sum of its movements is refused, whoever writes it.
 */
export const STOCK = [
  `CREATE TABLE "stock_movement" (
    "id" integer PRIMARY KEY AUTOINCREMENT NOT NULL,
    "partId" integer NOT NULL,
    "kind" text NOT NULL,
    "change" integer NOT NULL,
    "counted" integer,
    "after" integer NOT NULL,
    "place" text COLLATE NOCASE NOT NULL,
    "reason" text NOT NULL,
    "at" text NOT NULL,
    "actorId" varchar,
    "actorName" text NOT NULL,
    "requestKey" text,
    CONSTRAINT "stock_movement_part_row" FOREIGN KEY ("partId") REFERENCES "part" ("id")
  )`,
  `CREATE INDEX "stock_movement_part" ON "stock_movement" ("partId", "place", "change")`,
  `CREATE INDEX "stock_movement_at" ON "stock_movement" ("at")`,
  `CREATE UNIQUE INDEX "stock_movement_request" ON "stock_movement" ("requestKey")`,
  `CREATE TABLE "stock_level" (
    "partId" integer NOT NULL,
    "place" text COLLATE NOCASE NOT NULL,
    "quantity" integer NOT NULL,
    "lastMovementId" integer NOT NULL,
    "countedAt" text,
    PRIMARY KEY ("partId", "place")
  )`,
  `CREATE INDEX "stock_level_place" ON "stock_level" ("place")`,
  `CREATE TRIGGER "stock_movement_keep" BEFORE UPDATE ON "stock_movement"
    BEGIN SELECT RAISE(ABORT, 'stock movements are never changed'); END`,
  // INSERT OR REPLACE would take an older row away without a word.
  `CREATE TRIGGER "stock_movement_only_new" BEFORE INSERT ON "stock_movement"
    WHEN EXISTS (SELECT 1 FROM "stock_movement" WHERE "id" = new."id" OR "requestKey" = new."requestKey")
    BEGIN SELECT RAISE(ABORT, 'stock movements are never replaced'); END`,
  `CREATE TRIGGER "stock_movement_stay" BEFORE DELETE ON "stock_movement"
    BEGIN SELECT RAISE(ABORT, 'stock movements are never deleted'); END`,
  `CREATE TRIGGER "stock_movement_level" AFTER INSERT ON "stock_movement" BEGIN
    INSERT INTO "stock_level" ("partId", "place", "quantity", "lastMovementId", "countedAt")
      VALUES (new."partId", new."place", new."after", new."id",
        CASE WHEN new."kind" = 'counted' THEN new."at" END)
      ON CONFLICT ("partId", "place") DO UPDATE SET
        "quantity" = excluded."quantity",
        "lastMovementId" = excluded."lastMovementId",
        "countedAt" = COALESCE(excluded."countedAt", "countedAt");
  END`,
  ...(['INSERT', 'UPDATE'] as const).map(
    (act) => `CREATE TRIGGER "stock_level_on_${act.toLowerCase()}" BEFORE ${act} ON "stock_level"
      WHEN new."quantity" < 0 OR new."quantity" <> (
        SELECT COALESCE(SUM("change"), 0) FROM "stock_movement"
          WHERE "partId" = new."partId" AND "place" = new."place")
      BEGIN SELECT RAISE(ABORT, 'a shelf quantity is the sum of its movements'); END`,
  ),
  `CREATE TRIGGER "stock_level_stay" BEFORE DELETE ON "stock_level"
    BEGIN SELECT RAISE(ABORT, 'a shelf quantity is the sum of its movements'); END`,
];

/** In the order they are dropped; the triggers go with their tables. */
export const STOCK_TABLES = ['stock_level', 'stock_movement'];
