import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { startServer, type Client, type TestServer } from './harness.js';

interface Stage {
  pinionTeeth: number;
  wheelTeeth: number;
  contactRatio: number;
}
interface Outcome {
  options: {
    stages: Stage[];
    ratio: { numerator: string; denominator: string; errorPercent: number };
    cost: null;
    lossPercent: null;
  }[];
  search: { complete: boolean; combinations: number };
  whyNot: { stages: number; limit: string; message: string }[];
}
interface Refusal {
  errors?: { field: string; value: unknown; limit?: number | string; message: string }[];
}

let server: TestServer;
let viewer: Client;
beforeAll(async () => {
  server = await startServer();
  viewer = await server.as('viewer');
});
afterAll(() => server.close());

const REQUEST = {
  ratio: { target: '37.5', tolerancePercent: '1' },
  stages: { min: 2, max: 2 },
  teeth: { pinion: { min: 17, max: 24 }, wheel: { min: 40, max: 150 } },
  modules: [1],
  objective: 'ratio-error',
  limit: 10,
};

describe('the option search', () => {
  it('finds trains for 37.5 : 1, exact ratios first, unknown figures null', async () => {
    const { status, body } = await viewer.post<Outcome>('/api/calc/options', REQUEST);
    expect(status).toBe(200);
    expect(body.search.complete).toBe(true);
    expect(body.options).toHaveLength(10);
    for (const { stages, ratio, cost, lossPercent } of body.options) {
      const product = stages.reduce(
        (value, { pinionTeeth, wheelTeeth }) => value * (wheelTeeth / pinionTeeth),
        1,
      );
      expect(Number(ratio.numerator) / Number(ratio.denominator)).toBeCloseTo(product, 9);
      expect(Math.abs(ratio.errorPercent)).toBeLessThanOrEqual(1);
      for (const { contactRatio } of stages) expect(contactRatio).toBeGreaterThanOrEqual(1.2);
      expect([cost, lossPercent]).toEqual([null, null]);
    }
    const errors = body.options.map(({ ratio }) => Math.abs(ratio.errorPercent));
    expect(errors).toEqual([...errors].sort((a, b) => a - b));
  });

  it('solves 1/6.931 with teeth 12 to 60 as published (gear train design problem; seen): 16·19/(43·49)', async () => {
    const { body } = await viewer.post<Outcome>('/api/calc/options', {
      ratio: { target: '6.931', tolerancePercent: '1' },
      stages: { min: 2, max: 2 },
      teeth: { pinion: { min: 12, max: 60 }, wheel: { min: 12, max: 60 } },
      modules: [1],
      leastContactRatio: 0,
      stageRatio: { min: '0.2' },
      objective: 'ratio-error',
      limit: 1,
    });
    expect(body.search.complete).toBe(true);
    expect(body.options[0]?.ratio).toMatchObject({ numerator: '2107', denominator: '304' });
  });

  it('says why there is none instead of failing when nothing can meet the request', async () => {
    const { status, body } = await viewer.post<Outcome>('/api/calc/options', {
      ...REQUEST,
      stages: { min: 1, max: 1 },
    });
    expect(status).toBe(200);
    expect(body.options).toEqual([]);
    expect(body.whyNot).toContainEqual(expect.objectContaining({ stages: 1 }));
  });

  it('answers others while it works', async () => {
    const search = viewer.post('/api/calc/options', {
      ...REQUEST,
      stages: { min: 1, max: 3 },
      teeth: { pinion: { min: 12, max: 60 }, wheel: { min: 12, max: 150 } },
      objective: 'centre-distance',
      limit: 50,
    });
    const start = performance.now();
    const { status } = await viewer.get('/api/health');
    expect(status).toBe(200);
    expect(performance.now() - start).toBeLessThan(2000);
    expect((await search).status).toBe(200);
  });

  it.each([
    ['ratio.target', { ratio: { target: '0', tolerancePercent: '1' } }],
    ['ratio.target', { ratio: { target: '-3', tolerancePercent: '1' } }],
    ['ratio.target', { ratio: { target: 'NaN', tolerancePercent: '1' } }],
    ['ratio.target', { ratio: { target: null, tolerancePercent: '1' } }],
    ['ratio.target', { ratio: { target: '1e9', tolerancePercent: '1' } }],
    ['ratio.target', { ratio: { target: '9'.repeat(100_000), tolerancePercent: '1' } }],
    ['ratio.tolerancePercent', { ratio: { target: '5', tolerancePercent: '-1' } }],
    ['ratio.tolerance', { ratio: { target: '5', tolerancePercent: '1', tolerance: 1 } }],
    ['ratio.target', { ratio: undefined }],
    ['stages.max', { stages: { min: 1, max: 4 } }],
    ['teeth.pinion.max', { teeth: { pinion: { min: 24, max: 17 }, wheel: { min: 40, max: 150 } } }],
    ['teeth.wheel.min', { teeth: { pinion: { min: 17, max: 24 }, wheel: { min: 2, max: 150 } } }],
    ['modules', { modules: [] }],
    ['modules', { modules: Array.from({ length: 1000 }, (_, index) => index + 1) }],
    ['modules', { modules: 1 }],
    ['modules.0', { modules: ['Infinity'] }],
    ['objective', { objective: 'cost' }],
    ['objective', { objective: undefined }],
    ['limit', { limit: 1e9 }],
    ['envelope.length', { envelope: { length: 'wide', width: 100, height: 100, wall: 5 } }],
    ['load', { load: { inputTorque: 5, inputSpeed: 1400 } }],
    ['centreDistanceGrade', { centreDistanceGrade: 7 }],
    ['shiftPolicy', { shiftPolicy: 'best-contact' }],
    ['arrangement', { arrangement: 'folded' }],
    ['source', { source: 'stock-only' }],
    ['direction', { direction: 'backwards' }],
    ['colour', { colour: 'green' }],
  ])('refuses %s (case %#)', async (field, changes) => {
    const { status, body } = await viewer.post<Refusal>('/api/calc/options', { ...REQUEST, ...changes });
    expect(status, JSON.stringify(body).slice(0, 300)).toBe(400);
    expect(body.errors?.map((issue) => issue.field)).toContain(field);
    expect(JSON.stringify(body).length).toBeLessThan(3000);
  });

  it('gives no options and the reason for an envelope smaller than one gear', async () => {
    const envelope = { length: 10, width: 10, height: 10, wall: 4 };
    const { status, body } = await viewer.post<Outcome>('/api/calc/options', { ...REQUEST, envelope });
    expect(status).toBe(200);
    expect(body.options).toEqual([]);
    expect(body.whyNot.length).toBeGreaterThan(0);
  });

  it('takes a tolerance of 0: only the exact ratio counts', async () => {
    const { body } = await viewer.post<Outcome>('/api/calc/options', {
      ...REQUEST,
      ratio: { target: '37.5', tolerancePercent: '0' },
    });
    expect(body.options.length).toBeGreaterThan(0);
    for (const { ratio } of body.options) expect(`${ratio.numerator}/${ratio.denominator}`).toBe('75/2');
  });
});
