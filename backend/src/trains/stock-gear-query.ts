/** Every module that the library has a gear of: one look into the index for each, however many gears there are. */
export const GEAR_MODULES = `
  WITH RECURSIVE "known"("module") AS (
    SELECT MIN("module") FROM "part" WHERE "kind" = 'gear'
    UNION ALL
    SELECT (SELECT MIN("module") FROM "part" WHERE "kind" = 'gear' AND "module" > "known"."module")
    FROM "known" WHERE "known"."module" IS NOT NULL
  )
  SELECT "module" FROM "known" WHERE "module" IS NOT NULL`;

/** Whether a part has an offer, valid on a day that is bound twice, of a supplier that is asked. */
const isOffered = (partId: string) => `
  EXISTS (
    SELECT 1 FROM "offer" JOIN "supplier" ON "supplier"."id" = "offer"."supplierId"
    WHERE "offer"."partId" = ${partId} AND "offer"."standing" = 'open' AND "supplier"."standing" = 'active'
      AND "offer"."validFrom" <= ? AND ("offer"."validUntil" IS NULL OR "offer"."validUntil" >= ?)
  )`;

/**
 * The gears that fit many needs, bound as JSON, each with what lies on its shelf. The library is entered by kind, module
 * and teeth, once a need.
 * @param more a further column
 */
const fitting = (more = '') => `
  WITH "asked" AS MATERIALIZED (
    SELECT
      "value" ->> '$.need' AS "need",
      "value" ->> '$.module' AS "module",
      "value" ->> '$.teeth' AS "teeth",
      "value" ->> '$.pressure[0]' AS "pressureLow", "value" ->> '$.pressure[1]' AS "pressureHigh",
      "value" ->> '$.helix[0]' AS "helixLow", "value" ->> '$.helix[1]' AS "helixHigh",
      "value" ->> '$.hand' AS "hand",
      "value" ->> '$.shift[0]' AS "shiftLow", "value" ->> '$.shift[1]' AS "shiftHigh",
      "value" ->> '$.width[0]' AS "widthLow", "value" ->> '$.width[1]' AS "widthHigh",
      "value" ->> '$.wanted' AS "wanted"
    FROM json_each(?)
  ),
  "fitting" AS MATERIALIZED (
    SELECT "asked"."need", "asked"."wanted", "part"."id", "part"."number", "part"."bore", "part"."faceWidth",
      (SELECT SUM("level"."quantity") FROM "stock_level" "level" WHERE "level"."partId" = "part"."id") AS "shelf"
      ${more}
    FROM "asked" CROSS JOIN "part"
    WHERE "part"."kind" = 'gear' AND "part"."module" = "asked"."module" AND "part"."teeth" = "asked"."teeth"
      AND "part"."standing" = 'cleared'
      AND "part"."pressureAngleDeg" BETWEEN "asked"."pressureLow" AND "asked"."pressureHigh"
      AND "part"."helixAngleDeg" BETWEEN "asked"."helixLow" AND "asked"."helixHigh"
      AND ("asked"."hand" IS NULL OR "part"."hand" = "asked"."hand")
      AND COALESCE("part"."profileShift", 0) BETWEEN "asked"."shiftLow" AND "asked"."shiftHigh"
      AND "part"."faceWidth" BETWEEN "asked"."widthLow" AND "asked"."widthHigh"
  )`;

const COVERS = `COALESCE("shelf", 0) >= "wanted"`;

/**
 * For each need the gear that would be best if offers did not count, and whether it has one: then it is the best. Offers
 * are looked at for these gears only. Parameters: the needs as JSON, and twice the day.
 */
export const FIRST_GEARS = `
  ${fitting()}
  SELECT "need", "number", "bore", "shelf", ${isOffered('"first"."id"')} AS "offered" FROM (
    SELECT *, ROW_NUMBER() OVER (PARTITION BY "need" ORDER BY ${COVERS} DESC, "faceWidth", "number") AS "place"
    FROM "fitting"
  ) "first"
  WHERE "place" = 1`;

/** For each need the best gear, with the offers of every gear that fits looked at. Parameters as above. */
export const BEST_GEARS = `
  ${fitting(`, ${isOffered('"part"."id"')} AS "offered"`)}
  SELECT "need", "number", "bore", "shelf", "offered" FROM (
    SELECT *,
      ROW_NUMBER() OVER (PARTITION BY "need" ORDER BY ${COVERS} DESC, "offered" DESC, "faceWidth", "number") AS "place"
    FROM "fitting"
  )
  WHERE "place" = 1`;
