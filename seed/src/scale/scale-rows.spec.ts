import { checkRow } from '@stageyard/backend/bulk-loading/check-row';
import { type Supplier } from '@stageyard/backend/suppliers/entities/supplier.entity';
import { describe, expect, it } from 'vitest';
import scaleRows, { type ScaleOptions } from './scale-rows.js';

const SUPPLIERS = ['S-0001', 'S-0002', 'S-0003', 'S-0004'].map((code) => ({
  code,
  name: `Firm ${code}`,
  currency: 'EUR',
}));
const options = (changes: Partial<ScaleOptions> = {}): ScaleOptions => ({
  count: 3000,
  seed: 1,
  suppliers: SUPPLIERS,
  today: '2026-06-30',
  ...changes,
});
const rows = [...scaleRows(options())];

describe('the rows of a scale set', () => {
  it('are the same for the same seed, and others for another', () => {
    expect([...scaleRows(options())]).toEqual(rows);
    expect([...scaleRows(options({ seed: 2, count: 10 }))]).not.toEqual(rows.slice(0, 10));
    // A smaller set is the beginning of a larger one.
    expect([...scaleRows(options({ count: 50 }))]).toEqual(rows.slice(0, 50));
  });

  it('pass every rule that a part, an offer and a count must pass', () => {
    const known = new Map(
      SUPPLIERS.map((one, index) => [one.code, { ...one, id: index + 1, standing: 'active' } as Supplier]),
    );
    for (const row of rows) expect(() => checkRow(row, known, '2026-06-30')).not.toThrow();
  });

  it('mix gears with other parts, each described in its own words, with one to three offers', () => {
    expect(new Set(rows.map(({ part }) => part.description)).size).toBe(rows.length);
    const kinds = new Map<string, number>();
    for (const { part } of rows) kinds.set(part.kind, (kinds.get(part.kind) ?? 0) + 1);
    expect(kinds.get('gear')).toBeGreaterThan(rows.length * 0.7);
    expect(kinds.size).toBeGreaterThanOrEqual(10);
    for (const { offers = [] } of rows) {
      expect(offers.length).toBeGreaterThanOrEqual(1);
      expect(offers.length).toBeLessThanOrEqual(3);
      expect(new Set(offers.map(({ supplierCode }) => supplierCode)).size).toBe(offers.length);
    }
    expect(rows.filter(({ opening }) => opening).length).toBeGreaterThan(rows.length * 0.3);
  });
});
