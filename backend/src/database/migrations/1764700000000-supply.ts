import { type MigrationInterface, type QueryRunner } from 'typeorm';
import { STOCK, STOCK_TABLES } from './supply/stock.js';
import { SUPPLIERS, SUPPLIERS_TABLES } from './supply/suppliers.js';

/** What older tables gained. */
const COLUMNS: [table: string, column: string, type: string][] = [
  ['part', 'leastStock', 'integer'],
  ['train', 'buildQuantity', 'integer'],
  ['train', 'bomEdits', 'text'],
  ['train', 'offerChoices', 'text'],
];

/**
 * Parts whose shelf is watched are few among many; substitutes of keys, screws and housings are found by length; gears
 * by mass are a usual list.
 */
const INDEXES: [name: string, on: string][] = [
  ['part_least_stock', '"part" ("leastStock") WHERE "leastStock" IS NOT NULL'],
  ['part_kind_length', '"part" ("kind", "length")'],
  ['part_kind_mass', '"part" ("kind", "mass")'],
];

/** Suppliers, offers and stock; trains remember how many are built and what a person chose for their lines. */
export class Supply1764700000000 implements MigrationInterface {
  name = 'Supply1764700000000';

  async up(runner: QueryRunner): Promise<void> {
    for (const statement of [...SUPPLIERS, ...STOCK]) await runner.query(statement);
    for (const [table, column, type] of COLUMNS) {
      await runner.query(`ALTER TABLE "${table}" ADD COLUMN "${column}" ${type}`);
    }
    for (const [name, on] of INDEXES) await runner.query(`CREATE INDEX "${name}" ON ${on}`);
  }

  async down(runner: QueryRunner): Promise<void> {
    for (const [name] of INDEXES) await runner.query(`DROP INDEX "${name}"`);
    for (const [table, column] of [...COLUMNS].reverse()) {
      await runner.query(`ALTER TABLE "${table}" DROP COLUMN "${column}"`);
    }
    for (const table of [...STOCK_TABLES, ...SUPPLIERS_TABLES]) await runner.query(`DROP TABLE "${table}"`);
  }
}
