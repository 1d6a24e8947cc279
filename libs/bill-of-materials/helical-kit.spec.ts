import { describe, expect, it } from 'vitest';
import { buildBom, FLAG, type BomLine, type KitRequest } from './index.js';
import { emptyLibrary, libraryOf, newKitGear, newPartRef, twoStageKit } from './testing/kit-builder.js';

const ofKind = (lines: BomLine[], kind: BomLine['kind']) => lines.filter((line) => line.kind === kind);

describe('a helical stage', () => {
  const helical = (pinionHand: 'left' | 'right', wheelHand: 'left' | 'right'): KitRequest => {
    const kit = twoStageKit();
    const gears = [
      newKitGear({ stage: 1, role: 'pinion', teeth: 20, helixAngleDeg: 15, hand: pinionHand }),
      newKitGear({ stage: 1, role: 'wheel', teeth: 60, helixAngleDeg: 15, hand: wheelHand }),
    ];
    return { ...kit, gears, shafts: kit.shafts.slice(0, 2) };
  };

  it('names helix and hand, and asks the library for the hand', () => {
    const hands: (string | null)[] = [];
    const library = libraryOf({
      gear: (need) => {
        hands.push(need.hand);
        return null;
      },
    });
    const [pinion] = buildBom(helical('right', 'left'), library);
    expect(hands).toEqual(['right', 'left']);
    expect(pinion?.description).toBe(
      'Helical gear z 20, m 1.5, 20°, β 15° right, x 0, face 15 mm, bore 12 mm',
    );
  });

  it('needs both hands in stock', () => {
    const library = libraryOf({
      gear: (need) => (need.hand === 'left' ? newPartRef({ number: 'KW-00700', kind: 'gear' }) : null),
    });
    const gears = ofKind(buildBom(helical('right', 'left'), library), 'gear');
    expect(gears.map((line) => line.flags.includes(FLAG.bothHandsNeeded))).toEqual([true, true]);
    expect(ofKind(buildBom(helical('right', 'left'), emptyLibrary), 'gear')[0]?.flags).not.toContain(
      FLAG.bothHandsNeeded,
    );
  });

  it('flags two gears of one hand', () => {
    expect(ofKind(buildBom(helical('left', 'left'), emptyLibrary), 'gear')[0]?.flags).toContain(
      FLAG.sameHand,
    );
  });

  it('flags a hand that nobody chose: a gear maker cannot cut it', () => {
    const kit = helical('right', 'left');
    const [pinion, wheel] = ofKind(
      buildBom(
        { ...kit, gears: kit.gears.map((gear, i) => (i === 0 ? { ...gear, hand: null } : gear)) },
        emptyLibrary,
      ),
      'gear',
    );
    expect(pinion?.flags).toContain(FLAG.handNotChosen);
    expect(wheel?.flags).not.toContain(FLAG.handNotChosen);
    const [spur] = ofKind(buildBom(twoStageKit(), emptyLibrary), 'gear');
    expect(spur?.flags).not.toContain(FLAG.handNotChosen);
  });
});
