import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { ProblemError } from '../common/errors.js';
import { LIBRARIAN, newGear, newPart } from '../testing/new-part.js';
import { openTempLibrary, type TempLibrary } from '../testing/temp-library.js';
import { PartsReader } from './parts-reader.service.js';
import { PartsService } from './parts.service.js';

let library: TempLibrary;
let parts: PartsService;
let reader: PartsReader;

beforeAll(async () => {
  library = await openTempLibrary();
  parts = library.module.get(PartsService);
  reader = library.module.get(PartsReader);
});

afterAll(() => library.close());

const refusal = async (act: Promise<unknown>): Promise<ProblemError> => {
  const thrown: unknown = await act.then(
    () => null,
    (error: unknown) => error,
  );
  expect(thrown).toBeInstanceOf(Error);
  return thrown as ProblemError;
};

describe('adding a part', () => {
  it('gives running numbers that follow each other and never come back', async () => {
    const [first, second] = [
      await parts.create(LIBRARIAN, newGear()),
      await parts.create(LIBRARIAN, newGear()),
    ];
    expect(first.number).toMatch(/^KW-\d{5}$/);
    expect(Number(second.number.slice(3))).toBe(Number(first.number.slice(3)) + 1);
  });

  it('skips a running number that a person typed in before', async () => {
    const { number } = await parts.create(LIBRARIAN, newGear());
    const next = `KW-${String(Number(number.slice(3)) + 1).padStart(5, '0')}`;
    await parts.create(LIBRARIAN, newGear({ number: next }));
    const after = await parts.create(LIBRARIAN, newGear({ number: '  ' }));
    expect(Number(after.number.slice(3))).toBe(Number(next.slice(3)) + 1);
  });

  it('refuses a number twice, whatever its case, and names the part that has it', async () => {
    await parts.create(LIBRARIAN, newGear({ number: 'Winch-7', description: 'Drum pinion' }));
    const problem = await refusal(parts.create(LIBRARIAN, newGear({ number: ' wINCH-7 ' })));
    expect(problem).toMatchObject({ statusCode: 409, code: 'number-taken' });
    expect(problem.message).toContain('Winch-7');
    expect(problem.message).toContain('Drum pinion');
  });

  it('gives one of two simultaneous additions the number and refuses the other', async () => {
    const both = await Promise.allSettled([
      parts.create(LIBRARIAN, newGear({ number: 'RACE-1' })),
      parts.create(LIBRARIAN, newGear({ number: 'RACE-1' })),
    ]);
    expect(both.map(({ status }) => status).sort()).toEqual(['fulfilled', 'rejected']);
  });

  it('starts as a draft, fills in the defaults and computes the geometry', async () => {
    const part = await parts.create(LIBRARIAN, newGear({ attributes: { teeth: 12, module: 3 } }));
    expect(part.standing).toBe('draft');
    expect(part.attributes).toMatchObject({ pressureAngleDeg: 20, helixAngleDeg: 0, profileShift: null });
    // Kohara, Gear Technical Reference, table of standard spur gears (from memory): m 3, z 12.
    expect(part.computed?.referenceDiameter).toBeCloseTo(36, 9);
    expect(part.computed?.tipDiameter).toBeCloseTo(42, 9);
    expect(part.computed?.rootDiameter).toBeCloseTo(28.5, 9);
    expect(part.computed?.baseDiameter).toBeCloseTo(33.829, 3);
  });

  it.each([
    ['teeth', { teeth: 3 }],
    ['teeth', { teeth: 12.5 }],
    ['teeth', { teeth: '12' }],
    ['module', { module: 0 }],
    ['module', { module: Number.NaN }],
    ['pressureAngleDeg', { pressureAngleDeg: 21 }],
    ['helixAngleDeg', { helixAngleDeg: 46 }],
    ['faceWidth', { faceWidth: -1 }],
    ['bore', { bore: null }],
    ['hand', { helixAngleDeg: 15 }],
    ['hand', { hand: 'left' }],
    ['profileShift', { teeth: 8, profileShift: 1.5 }],
    ['colour', { colour: 'green' }],
    // m 2, z 24 has a root diameter of 2 · (24 − 2.5) = 43 mm.
    ['bore', { bore: 43 }],
    ['bore', { bore: 20, hubDiameter: 18 }],
    ['thicknessAllowanceLower', { thicknessAllowanceUpper: -0.1, thicknessAllowanceLower: -0.05 }],
  ])('refuses attributes.%s of %o', async (field, attributes) => {
    const problem = await refusal(parts.create(LIBRARIAN, newGear({ attributes })));
    const fields = problem.errors?.map((issue) => issue.field) ?? [];
    expect(fields).toContain(`attributes.${field}`);
  });

  it('checks the attributes of every kind by their own list', async () => {
    const seal = {
      ...newGear(),
      kind: 'seal' as const,
      attributes: { shaftDiameter: 20, outerDiameter: 35 },
    };
    const problem = await refusal(parts.create(LIBRARIAN, seal));
    expect(problem.errors?.map((issue) => issue.field)).toEqual(['attributes.width']);
  });
});

describe('sizes that contradict each other', () => {
  it.each([
    ['bore', 'bearing', { bore: 47, outerDiameter: 47, width: 14, type: 'deep groove ball' }],
    ['shaftDiameter', 'seal', { shaftDiameter: 40, outerDiameter: 35, width: 7 }],
    ['grooveDiameter', 'retaining-ring', { shaftDiameter: 20, thickness: 1.2, grooveDiameter: 21 }],
    ['wall', 'housing', { length: 200, width: 100, height: 20, wall: 10 }],
  ] as const)('name attributes.%s of a %s', async (field, kind, attributes) => {
    const problem = await refusal(parts.create(LIBRARIAN, newPart(kind, attributes)));
    expect(problem.errors?.map((issue) => issue.field)).toEqual([`attributes.${field}`]);
  });
});

describe('changing a part', () => {
  it('counts the version up and refuses an edit of an older one, showing what is there now', async () => {
    const part = await parts.create(LIBRARIAN, newGear({ description: 'First' }));
    const second = await parts.update(LIBRARIAN, part.number, { version: 1, description: 'Second' });
    expect(second.version).toBe(2);
    const problem = await refusal(parts.update(LIBRARIAN, part.number, { version: 1, description: 'Third' }));
    expect(problem).toMatchObject({ statusCode: 409, code: 'changed-meanwhile' });
    expect(problem.extra.current).toMatchObject({ description: 'Second', version: 2 });
    expect((await reader.get(part.number)).description).toBe('Second');
  });

  it('lets one of two simultaneous edits through', async () => {
    const { number } = await parts.create(LIBRARIAN, newGear());
    const both = await Promise.allSettled(
      ['one', 'two'].map((description) => parts.update(LIBRARIAN, number, { version: 1, description })),
    );
    expect(both.map(({ status }) => status).sort()).toEqual(['fulfilled', 'rejected']);
    expect((await reader.get(number)).version).toBe(2);
  });

  it('goes draft → cleared → withdrawn → cleared, and records each step', async () => {
    const { number } = await parts.create(LIBRARIAN, newGear());
    const other = await parts.create(LIBRARIAN, newGear());
    await parts.update(LIBRARIAN, number, { version: 1, standing: 'cleared' });
    const withdrawn = await parts.update(LIBRARIAN, number, {
      version: 2,
      standing: 'withdrawn',
      successorNumber: other.number.toLowerCase(),
    });
    expect(withdrawn.successorNumber).toBe(other.number);
    const again = await parts.update(LIBRARIAN, number, { version: 3, standing: 'cleared' });
    expect(again).toMatchObject({ standing: 'cleared', successorNumber: null, version: 4 });
    const changes = await reader.changes(number, {});
    expect(changes.items.map(({ action }) => action)).toEqual([
      'cleared again',
      'withdrew',
      'cleared',
      'added',
    ]);
    expect(changes.items[1]).toMatchObject({
      by: LIBRARIAN.name,
      before: { standing: 'cleared', successorNumber: null },
      after: { standing: 'withdrawn', successorNumber: other.number },
    });
  });

  it('never goes back to draft', async () => {
    const { number } = await parts.create(LIBRARIAN, newGear({ standing: 'cleared' }));
    const problem = await refusal(parts.update(LIBRARIAN, number, { version: 1, standing: 'draft' }));
    expect(problem.errors?.[0]?.field).toBe('standing');
  });

  it('refuses a successor that does not exist, is the part itself, or leads back to it', async () => {
    const [a, b, c] = await Promise.all(
      [1, 2, 3].map(() => parts.create(LIBRARIAN, newGear({ standing: 'cleared' }))),
    );
    if (!a || !b || !c) throw new Error('Three parts were asked for.');
    const withdraw = (number: string, successorNumber: string) =>
      parts.update(LIBRARIAN, number, { version: 1, standing: 'withdrawn', successorNumber });
    expect((await refusal(withdraw(a.number, 'KW-99999'))).message).toContain('There is no part');
    expect((await refusal(withdraw(a.number, a.number))).message).toContain('itself');
    await withdraw(a.number, b.number);
    await withdraw(b.number, c.number);
    const circle = await refusal(withdraw(c.number, a.number));
    expect(circle.message).toContain('circle');
    expect(circle.errors?.[0]?.field).toBe('successorNumber');
  });

  it('refuses a successor for a part that stays in use', async () => {
    const [a, b] = [await parts.create(LIBRARIAN, newGear()), await parts.create(LIBRARIAN, newGear())];
    const problem = await refusal(
      parts.update(LIBRARIAN, a.number, { version: 1, successorNumber: b.number }),
    );
    expect(problem.errors?.[0]?.field).toBe('successorNumber');
  });

  it('neither counts nor records an edit that changes nothing', async () => {
    const part = await parts.create(LIBRARIAN, newGear());
    const { description, mass } = part;
    const attributes = Object.fromEntries(Object.entries(part.attributes).reverse());
    const same = { version: 1, description, mass, attributes };
    expect(await parts.update(LIBRARIAN, part.number, same)).toEqual(part);
    expect((await reader.changes(part.number, {})).total).toBe(1);
  });

  it('keeps nothing of a refused edit', async () => {
    const { number } = await parts.create(LIBRARIAN, newGear());
    const attributes = { ...newGear().attributes, teeth: 2 };
    await refusal(parts.update(LIBRARIAN, number, { version: 1, description: 'Lost', attributes }));
    expect(await reader.get(number)).toMatchObject({ version: 1, description: newGear().description });
    expect((await reader.changes(number, {})).total).toBe(1);
  });
});
