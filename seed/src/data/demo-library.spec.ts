import { parallelKeyForBore } from '@stageyard/libs/bill-of-materials';
import { gearGeometry } from '@stageyard/libs/gear-geometry';
import { describe, expect, it } from 'vitest';
import { type GearRow } from './gears.js';
import { demoLibrary, type LibraryRow } from './library.js';
import { type OtherRow } from './other-parts.js';

const isGear = (row: LibraryRow): row is GearRow => row.kind === 'gear';
const isOther = (row: LibraryRow): row is OtherRow => row.kind !== 'gear';
const library = demoLibrary();
const gears = library.filter(isGear);
const others = library.filter(isOther);

describe('demo library', () => {
  it('holds at least 1,500 gears and 300 other parts, nearly all cleared, none described twice', () => {
    expect(gears.length).toBeGreaterThanOrEqual(1500);
    expect(others.length).toBeGreaterThanOrEqual(300);
    expect(new Set(library.map((row) => row.description)).size).toBe(library.length);
    const cleared = library.filter((row) => row.standing === 'cleared');
    expect(cleared.length / library.length).toBeGreaterThan(0.95);
    expect(cleared.length).toBeLessThan(library.length);
  });

  it('spans spur and helical, modules 0.5 to 5, 12 to 140 teeth and eight materials', () => {
    const modules = gears.map((row) => row.attributes.module);
    const teeth = gears.map((row) => row.attributes.teeth);
    expect([Math.min(...modules), Math.max(...modules)]).toEqual([0.5, 5]);
    expect([Math.min(...teeth), Math.max(...teeth)]).toEqual([12, 140]);
    expect(new Set(gears.map((row) => row.attributes.helixAngleDeg))).toEqual(new Set([0, 15]));
    expect(new Set(gears.map((row) => row.material)).size).toBe(8);
  });

  it('has no gear that the geometry library refuses', () => {
    for (const { attributes } of gears) {
      const geometry = gearGeometry({
        teeth: attributes.teeth,
        module: attributes.module,
        pressureAngleDeg: attributes.pressureAngleDeg,
        helixAngleDeg: attributes.helixAngleDeg,
        ...(attributes.hand === null ? {} : { hand: attributes.hand }),
      });
      expect(geometry.tipThickness).toBeGreaterThan(0);
      // Common practice, no source: two modules of rim under the tooth root, and a hub that stays below it.
      expect(geometry.rootDiameter - attributes.bore).toBeGreaterThanOrEqual(4 * attributes.module - 1e-9);
      if (attributes.hubDiameter !== null) expect(attributes.hubDiameter).toBeLessThan(geometry.rootDiameter);
    }
  });

  it('keeps both hands of every helical gear, since a pair needs one of each', () => {
    const name = ({ attributes: a }: (typeof gears)[number]) => `${a.module} ${a.teeth}`;
    const helical = gears.filter((row) => row.attributes.helixAngleDeg > 0);
    const left = helical.filter((row) => row.attributes.hand === 'left').map(name);
    const right = helical.filter((row) => row.attributes.hand === 'right').map(name);
    expect(left.length).toBeGreaterThan(0);
    expect(left.sort()).toEqual(right.sort());
  });

  it('has the key section of DIN 6885-1 for every bore from 6.5 to 50 mm', () => {
    const sections = new Set(
      others
        .filter((row) => row.kind === 'key')
        .map((row) => `${row.attributes.width}×${row.attributes.height}`),
    );
    for (const bore of [6.5, 9, 11, 15, 17, 20, 25, 35, 40, 50]) {
      const section = parallelKeyForBore(bore);
      expect(sections).toContain(`${section?.width}×${section?.height}`);
    }
  });

  it('has a bearing, a ring and a seal for the common shaft sizes', () => {
    const sizes = (kind: string, field: string) =>
      new Set(others.filter((row) => row.kind === kind).map((row) => row.attributes[field]));
    for (const diameter of [8, 10, 12, 15, 17, 20, 25, 30, 35, 40]) {
      expect(sizes('bearing', 'bore')).toContain(diameter);
      expect(sizes('retaining-ring', 'shaftDiameter')).toContain(diameter);
      expect(sizes('seal', 'shaftDiameter')).toContain(diameter);
    }
  });
});
