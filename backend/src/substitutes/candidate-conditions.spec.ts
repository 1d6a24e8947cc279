import { type SubstituteSizes, type SubstituteTeeth } from '@stageyard/libs/bill-of-materials';
import { type Repository } from 'typeorm';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { Part } from '../parts/entities/part.entity.js';
import { openTempDatabase, type TempDatabase } from '../testing/temp-database.js';
import { narrowToCandidates } from './candidate-conditions.js';

let database: TempDatabase;
let parts: Repository<Part>;
beforeAll(async () => {
  database = await openTempDatabase();
  parts = database.source.getRepository(Part);
});
afterAll(() => database.close());

const teeth: SubstituteTeeth = {
  ...{
    teeth: 30,
    module: 2,
    pressureAngleDeg: 20,
    helixAngleDeg: 0,
    hand: null,
    profileShift: 0,
    faceWidth: 20,
  },
  ...{ heatTreatment: null, hardened: false, strength: null, softerThanSteel: false },
};

describe('narrowing to candidates', () => {
  it.each<[SubstituteSizes, string]>([
    [
      { ...teeth, kind: 'gear', bore: 15, hubDiameter: null, hubLength: null },
      'part_kind_tooth (kind=? AND module=? AND teeth=?)',
    ],
    [{ ...teeth, kind: 'pinion-shaft', shaftDiameter: 15, shaftLength: 90 }, 'part_kind_'],
    [{ kind: 'shaft', diameter: 20, length: 100 }, 'part_kind_shaft (kind=? AND shaftDiameter=?)'],
    [
      {
        ...{ kind: 'bearing', bore: 12, outerDiameter: 32, width: 10, type: null },
        ...{ dynamicLoadRating: null, staticLoadRating: null },
      },
      'part_kind_bore (kind=? AND bore=?)',
    ],
    [{ kind: 'key', width: 6, height: 6, length: 20 }, 'part_kind_length (kind=? AND length=?)'],
    [
      { kind: 'retaining-ring', shaftDiameter: 20, thickness: 1.2, grooveDiameter: null },
      'part_kind_shaft (kind=? AND shaftDiameter=?)',
    ],
    [
      { kind: 'seal', shaftDiameter: 20, outerDiameter: null, width: null },
      'part_kind_shaft (kind=? AND shaftDiameter=?)',
    ],
    [
      { kind: 'fastener', thread: 'M6', length: 20, strengthClass: '8.8' },
      'part_kind_length (kind=? AND length=?)',
    ],
    // Few of their kind in any library.
    [{ kind: 'housing', length: 200, width: 100, height: 90, wall: 5 }, 'part_kind_'],
    [{ kind: 'lubricant', viscosityGrade: 'ISO VG 220', packVolume: null }, 'part_kind_'],
  ])('of $kind asks an index that begins with the kind', async (sizes, index) => {
    const rows = parts.createQueryBuilder('part');
    narrowToCandidates(rows, sizes, {});
    const [sql, values] = rows.limit(500).getQueryAndParameters();
    const plan = await parts.query<{ detail: string }[]>(`EXPLAIN QUERY PLAN ${sql}`, values);
    expect(plan).toHaveLength(1);
    expect(plan[0]?.detail).toContain(`USING INDEX ${index}`);
  });

  it('holds what a place asks for against the candidates, not what the original has', () => {
    const rows = parts.createQueryBuilder('part');
    const place = { leastFaceWidth: 15, mostFaceWidth: 25, shaftDiameter: 12 };
    narrowToCandidates(rows, { ...teeth, kind: 'gear', bore: 15, hubDiameter: null, hubLength: null }, place);
    const { faceWidthLeast, faceWidthMost, boreMost } = rows.getParameters();
    expect(faceWidthLeast).toBeCloseTo(15, 5);
    expect(faceWidthMost).toBeCloseTo(25, 5);
    expect(boreMost).toBeCloseTo(12, 5);
  });
});
