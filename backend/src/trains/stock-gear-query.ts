/** Every module that the library has a gear of: one look into the index for each, however many gears there are. */
export const GEAR_MODULES = `
  WITH RECURSIVE "known"("module") AS (
    SELECT MIN("module") FROM "part" WHERE "kind" = 'gear'
    UNION ALL
    SELECT (SELECT MIN("module") FROM "part" WHERE "kind" = 'gear' AND "module" > "known"."module")
    FROM "known" WHERE "known"."module" IS NOT NULL
  )
  SELECT "module" FROM "known" WHERE "module" IS NOT NULL`;

/**
 * The best gear for each of many needs. Parameters: the needs as JSON, and twice the day that offers are held against.
 * The library is entered by kind, module and teeth, once a need; shelf and offers are looked at only for gears that fit.
 */
export const BEST_GEARS = `
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
    SELECT "asked"."need", "asked"."wanted", "part"."number", "part"."bore", "part"."faceWidth",
      (SELECT SUM("level"."quantity") FROM "stock_level" "level" WHERE "level"."partId" = "part"."id") AS "shelf",
      EXISTS (
        SELECT 1 FROM "offer" JOIN "supplier" ON "supplier"."id" = "offer"."supplierId"
        WHERE "offer"."partId" = "part"."id" AND "offer"."standing" = 'open' AND "supplier"."standing" = 'active'
          AND "offer"."validFrom" <= ? AND ("offer"."validUntil" IS NULL OR "offer"."validUntil" >= ?)
      ) AS "offered"
    FROM "asked" CROSS JOIN "part"
    WHERE "part"."kind" = 'gear' AND "part"."module" = "asked"."module" AND "part"."teeth" = "asked"."teeth"
      AND "part"."standing" = 'cleared'
      AND "part"."pressureAngleDeg" BETWEEN "asked"."pressureLow" AND "asked"."pressureHigh"
      AND "part"."helixAngleDeg" BETWEEN "asked"."helixLow" AND "asked"."helixHigh"
      AND ("asked"."hand" IS NULL OR "part"."hand" = "asked"."hand")
      AND COALESCE("part"."profileShift", 0) BETWEEN "asked"."shiftLow" AND "asked"."shiftHigh"
      AND "part"."faceWidth" BETWEEN "asked"."widthLow" AND "asked"."widthHigh"
  )
  SELECT "need", "number", "bore", "shelf" FROM (
    SELECT *, ROW_NUMBER() OVER (
      PARTITION BY "need"
      ORDER BY COALESCE("shelf", 0) >= "wanted" DESC, "offered" DESC, "faceWidth", "number"
    ) AS "place"
    FROM "fitting"
  )
  WHERE "place" = 1`;
