import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { startServer, type Client, type TestServer } from './harness.js';

interface Refusal {
  statusCode: number;
  code: string;
  message: string;
  errors?: { field: string; value: unknown; limit?: number | string; message: string }[];
}
interface Mesh {
  centreDistance: number;
  operatingPressureAngleDeg: number;
  pathOfContact: number;
  contactRatio: number;
  contactRatioIgnoringUndercut: number;
  gear: Record<'pinion' | 'wheel', Record<string, number>>;
  findings: { code: string; severity: string }[];
}

let server: TestServer;
let viewer: Client;
beforeAll(async () => {
  server = await startServer();
  viewer = await server.as('viewer');
});
afterAll(() => server.close());

async function calc<T>(what: string, input: unknown): Promise<T> {
  const { status, body } = await viewer.post<T>(`/api/calc/${what}`, input);
  expect(status, JSON.stringify(body)).toBe(200);
  return body;
}

/** The fields that a refusal names; the answer must be a 400 in the one shape of refusals. */
async function refusedFields(what: string, input: unknown): Promise<string[]> {
  const { status, body } = await viewer.post<Refusal>(`/api/calc/${what}`, input);
  expect(status, JSON.stringify(body).slice(0, 500)).toBe(400);
  expect(body.code).toBe('bad-input');
  expect(JSON.stringify(body)).not.toMatch(/\.ts:|\.js:|node_modules/);
  return body.errors?.map(({ field }) => field) ?? [];
}

describe('one gear', () => {
  it('m 3, z 12 and z 24 have the printed diameters (Kohara, Gear Technical Reference; from memory)', async () => {
    const pinion = await calc<Record<string, number>>('gear', { teeth: 12, module: 3 });
    expect(pinion.referenceDiameter).toBeCloseTo(36, 9);
    expect(pinion.baseDiameter).toBeCloseTo(33.829, 3);
    expect(pinion.tipDiameter).toBeCloseTo(42, 9);
    expect(pinion.rootDiameter).toBeCloseTo(28.5, 9);
    expect((await calc<Record<string, number>>('gear', { teeth: 24, module: 3 })).baseDiameter).toBeCloseTo(
      67.658,
      3,
    );
  });

  it('m_n 4, β 15°, z 20 is as printed (Jindal, Machine Design, ex. 26-1; seen)', async () => {
    const gear = await calc<Record<string, number>>('gear', { teeth: 20, module: 4, helixAngleDeg: 15 });
    expect(gear.tipDiameter).toBeCloseTo(90.8, 1);
    expect(gear.rootDiameter).toBeCloseTo(72.8, 1);
    expect(gear.transverseModule).toBeCloseTo(4.14, 2);
    expect(gear.transversePressureAngleDeg).toBeCloseTo(20.647, 3);
  });

  it('spans 32.8266 over 4 teeth at m 3, z 24, x 0.4 (from memory)', async () => {
    const gear = await calc<Record<string, number>>('gear', { teeth: 24, module: 3, profileShift: 0.4 });
    expect(gear.spanTeeth).toBe(4);
    expect(gear.spanLength).toBeCloseTo(32.8266, 4);
  });

  it.each([
    ['teeth', { teeth: 3, module: 1 }],
    ['teeth', { teeth: 12.5, module: 1 }],
    ['teeth', { teeth: '12', module: 1 }],
    ['teeth', { teeth: null, module: 1 }],
    ['teeth', { module: 1 }],
    ['module', { teeth: 12, module: 0 }],
    ['module', { teeth: 12, module: 'NaN' }],
    ['module', { teeth: 12, module: 'Infinity' }],
    ['module', { teeth: 12, module: -2 }],
    ['module', { teeth: 12, module: 1e9 }],
    ['pressureAngleDeg', { teeth: 12, module: 1, pressureAngleDeg: 21 }],
    ['helixAngleDeg', { teeth: 12, module: 1, helixAngleDeg: 46 }],
    // What NaN becomes in JSON.
    ['profileShift', { teeth: 12, module: 1, profileShift: null }],
    ['profileShift', { teeth: 12, module: 1, profileShift: 0.9 }],
    ['rack.tipRadius', { teeth: 12, module: 1, rack: { tipRadius: 2 } }],
    ['rack.radius', { teeth: 12, module: 1, rack: { radius: 2 } }],
    ['rack', { teeth: 12, module: 1, rack: [1, 2] }],
    ['thicknessAllowance.upper', { teeth: 12, module: 1, thicknessAllowance: { upper: 0.1, lower: 0 } }],
    ['profilShift', { teeth: 12, module: 1, profilShift: 0.3 }],
  ])('refuses %s (case %#)', async (field, input) => {
    expect(await refusedFields('gear', input)).toContain(field);
  });

  it('does not send back an unknown field of 100,000 characters', async () => {
    const input = { teeth: 12, module: 1, ['x'.repeat(100_000)]: 'y'.repeat(100_000) };
    const { status, body } = await viewer.post<Refusal>('/api/calc/gear', input);
    expect(status).toBe(400);
    expect(body.errors?.[0]?.field).toMatch(/^x+…$/);
    expect(JSON.stringify(body).length).toBeLessThan(1000);
  });

  it('names every field at fault at once, with its value and the limit', async () => {
    const { body } = await viewer.post<Refusal>('/api/calc/gear', {
      teeth: 2,
      module: -1,
      helixAngleDeg: 80,
    });
    expect(body.errors?.map(({ field, value }) => [field, value])).toEqual([
      ['teeth', 2],
      ['module', -1],
      ['helixAngleDeg', 80],
    ]);
    expect(body.errors?.[0]?.limit).toBe(4);
    expect(body.errors?.[2]?.limit).toBe(45);
  });

  it('reads a number beyond any number as what it is: infinite, and refused', async () => {
    const { status, body } = await viewer.post<Refusal>('/api/calc/gear', '{"teeth":12,"module":1e999}');
    expect(status).toBe(400);
    expect(body.errors?.[0]).toMatchObject({ field: 'module', value: 'Infinity' });
  });

  it.each([
    ['not JSON', '{"teeth":'],
    ['a list', '[]'],
    ['a bare word', '"gear"'],
    ['nothing', 'null'],
  ])('refuses %s as a whole', async (_, text) => {
    const { status, body } = await viewer.post<Refusal>('/api/calc/gear', text);
    expect(status).toBe(400);
    expect(body.message.length).toBeGreaterThan(20);
  });
});

describe('one pair', () => {
  const pair = { pinion: { teeth: 12, module: 3 }, wheel: { teeth: 24, module: 3 } };

  it('m 3, 12/24 stands at 54 (Kohara; from memory); its contact ratio, undercut included, is recomputed', async () => {
    const mesh = await calc<Mesh>('mesh', pair);
    expect(mesh.centreDistance).toBeCloseTo(54, 9);
    expect(mesh.contactRatioIgnoringUndercut).toBeCloseTo(1.51112, 5);
    expect(mesh.contactRatio).toBeCloseTo(1.27456, 5);
  });

  it('works at 26.0886° when 12/24 stand at 56.4999 with x 0.6/0.36 (Kohara; from memory)', async () => {
    const mesh = await calc<Mesh>('mesh', {
      pinion: { teeth: 12, module: 3, profileShift: 0.6 },
      wheel: { teeth: 24, module: 3, profileShift: 0.36 },
    });
    expect(mesh.centreDistance).toBeCloseTo(56.4999, 4);
    expect(mesh.operatingPressureAngleDeg).toBeCloseTo(26.0886, 4);
  });

  it('30/80, m 12, addendum 10 has a path of 52.3 (Khurmi & Gupta 12.3; inputs seen, answer from memory)', async () => {
    const rack = { addendum: 10 / 12 };
    const mesh = await calc<Mesh>('mesh', {
      pinion: { teeth: 30, module: 12, rack },
      wheel: { teeth: 80, module: 12, rack },
    });
    expect(mesh.pathOfContact).toBeCloseTo(52.3, 1);
  });

  it('P 6, 19/37 has the ratio 1.62, at 2 % more distance 1.102 (Norton; from memory, second recomputed)', async () => {
    const module = 25.4 / 6;
    const gears = { pinion: { teeth: 19, module }, wheel: { teeth: 37, module } };
    const nominal = await calc<Mesh>('mesh', gears);
    expect(nominal.contactRatio).toBeCloseTo(1.62, 2);
    const apart = await calc<Mesh>('mesh', { ...gears, centreDistance: nominal.centreDistance * 1.02 });
    expect(apart.operatingPressureAngleDeg).toBeCloseTo(22.89, 2);
    expect(apart.contactRatio).toBeCloseTo(1.102185, 6);
    expect(apart.findings).toContainEqual(expect.objectContaining({ code: 'contact-ratio-low' }));
  });

  it.each([
    ['allowance', { ...pair, centreDistance: 55, allowance: 0.1 }],
    ['pinion.teeth', { ...pair, pinion: { teeth: 2, module: 3 } }],
    ['wheel.module', { ...pair, wheel: { teeth: 24, module: 2 } }],
    ['wheel.hand', { pinion: { ...pair.pinion, hand: 'left' }, wheel: { ...pair.wheel, hand: 'left' } }],
    ['centreDistance', { ...pair, centreDistance: 10 }],
    ['centreDistance', { ...pair, centreDistance: 'Infinity' }],
    ['pinion', { wheel: pair.wheel }],
    ['pinion', { ...pair, pinion: 5 }],
    ['wheel', { ...pair, wheel: null }],
    ['wheel.colour', { ...pair, wheel: { ...pair.wheel, colour: 1 } }],
  ])('refuses %s (case %#)', async (field, input) => {
    // A hand means something only where there is a helix.
    const helical = field === 'wheel.hand';
    const body = helical
      ? {
          pinion: { ...(input as typeof pair).pinion, helixAngleDeg: 15 },
          wheel: { ...(input as typeof pair).wheel, helixAngleDeg: 15 },
        }
      : input;
    expect(await refusedFields('mesh', body)).toContain(field);
  });
});

describe('profile shifts', () => {
  const pair = { pinion: { teeth: 12, module: 1 }, wheel: { teeth: 40, module: 1 } };

  it('clear the undercut of 12 teeth by about 0.2981 with the sharp rack {1, 1, 0} (formula)', async () => {
    const rack = { addendum: 1, dedendum: 1, tipRadius: 0 };
    const shift = await calc<{ pinionShift: number; wheelShift: number }>('shift', {
      pinion: { ...pair.pinion, rack },
      wheel: { ...pair.wheel, rack },
      policy: 'clear-undercut',
    });
    // 0.2981 is x_min to four places, so it lies within 0.00005 of it; the policy rounds up to a multiple of 1e-4.
    expect(shift.pinionShift).toBeGreaterThanOrEqual(0.2981 - 0.00005);
    expect(shift.pinionShift).toBeLessThan(0.2981 + 0.00005 + 0.0001);
    expect(shift.wheelShift).toBe(0);
  });

  it.each(['best-contact', 'balanced-sliding', 'given', '', null])(
    'refuses the policy %s and says which there are',
    async (policy) => {
      const { status, body } = await viewer.post<Refusal>('/api/calc/shift', { ...pair, policy });
      expect(status).toBe(400);
      expect(body.errors?.map(({ field }) => field)).toEqual(['policy']);
      expect(body.errors?.[0]?.message).toContain('clear-undercut');
    },
  );
});

describe('fractions', () => {
  interface Fractions {
    mediants: { numerator: string; denominator: string; errorPercent: number }[];
    convergents: { numerator: string; denominator: string }[];
  }
  const written = (list: Fractions['convergents']) =>
    list.map(({ numerator, denominator }) => `${numerator}/${denominator}`);

  it('approach 191/23 by 25/3, 33/4, 58/7, 83/10, 108/13 (Brocot; from memory)', async () => {
    const target = (191 / 23).toFixed(12);
    const found = await calc<Fractions>('fractions', { target });
    const mediants = written(found.mediants);
    for (const fraction of ['25/3', '33/4', '58/7', '83/10', '108/13']) expect(mediants).toContain(fraction);
    expect(written(found.convergents).slice(0, 3)).toEqual(['8/1', '25/3', '83/10']);
  });

  it.each([
    ['target', { target: '0' }],
    ['target', { target: '-2' }],
    ['target', { target: 'NaN' }],
    ['target', {}],
    ['target', { target: null }],
    ['target', { target: { numerator: '1' } }],
    ['target', { target: '1/2' }],
    ['tolerancePercent', { target: '2.5', tolerancePercent: null }],
    ['tolerancePercent', { target: '2.5', tolerancePercent: [1] }],
    ['tolerance', { target: '2.5', tolerance: 1 }],
    ['target', { target: '1'.repeat(100_000) }],
    ['maxTeeth', { target: '2.5', maxTeeth: 0 }],
    ['maxTeeth', { target: '2.5', maxTeeth: null }],
    ['limit', { target: '2.5', limit: 1e9 }],
    ['tolerancePercent', { target: '2.5', tolerancePercent: -1 }],
  ])('refuse %s (case %#)', async (field, input) => {
    expect(await refusedFields('fractions', input)).toEqual([field]);
  });
});

describe('calculations', () => {
  it('are open to anybody signed in, and to nobody else', async () => {
    const gear = { teeth: 12, module: 3 };
    for (const role of ['admin', 'designer', 'librarian', 'purchaser'] as const) {
      expect((await (await server.as(role)).post('/api/calc/gear', gear)).status).toBe(200);
    }
    expect((await server.anonymous().post('/api/calc/gear', gear)).status).toBe(401);
  });
});
