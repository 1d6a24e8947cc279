import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { PartsService } from '../src/parts/parts.service.js';
import { newRequirement } from '../src/testing/new-brief.js';
import { LIBRARIAN, newGear } from '../src/testing/new-part.js';
import { newTrain } from '../src/testing/new-train.js';
import { addSignedIn } from '../src/testing/people.js';
import { type BomDto } from '../src/trains/dto/bom.dto.js';
import { type TrainDto } from '../src/trains/dto/train.dto.js';
import { type Client, startServer, type TestServer } from './harness.js';

interface Refusal {
  errors?: { field: string; message: string; limit?: unknown }[];
}

let server: TestServer;
let designer: Client;
let train: TrainDto;
let stockNumber: string;

beforeAll(async () => {
  server = await startServer();
  designer = await server.as('designer');
  const person = await addSignedIn(server.app, 'designer');
  train = await newTrain(server.app, person, { requirement: newRequirement({ stages: { min: 2, max: 2 } }) });
  const [stage] = train.spec.stages;
  const attributes = {
    teeth: stage?.wheel.teeth,
    module: stage?.module,
    faceWidth: stage?.wheel.faceWidth,
    profileShift: 0,
    bore: 12,
  };
  const gear = newGear({ standing: 'cleared', attributes });
  stockNumber = (await server.app.get(PartsService).create(LIBRARIAN, gear)).number;
});
afterAll(() => server.close());

const path = () => `/api/trains/${train.code}`;
const patch = (body: object) =>
  designer.patch<TrainDto & Refusal>(path(), { version: train.version, ...body });

describe('changing a train', () => {
  it('takes a stock gear, and the bill of materials names it', async () => {
    const stages = [{ wheel: { partNumber: stockNumber.toLowerCase() } }, {}];
    const answer = await patch({ stages, title: ' Renamed ', note: 'Line one\nline two' });
    expect(answer.status).toBe(200);
    train = answer.body;
    expect(train).toMatchObject({ version: 2, title: 'Renamed', note: 'Line one\nline two' });
    expect(train.spec.stages[0]?.wheel.partNumber).toBe(stockNumber);
    const { body } = await designer.get<BomDto>(`${path()}/bom`);
    expect(body.lines.find(({ partNumber }) => partNumber === stockNumber)?.source).toEqual([
      'Stage 1 wheel',
    ]);
  });

  it('takes shaft diameters and leaves those that are null', async () => {
    const before = train.spec.shafts;
    const answer = await patch({ shaftDiameters: [null, 12, null] });
    train = answer.body;
    expect(train.spec.shafts).toEqual([before[0], { diameter: 12, basis: 'typed' }, before[2]]);
  });

  it.each<[string, object, string]>([
    [
      'a part of other data',
      { stages: [{ pinion: { partNumber: '#stock' } }, {}] },
      'stages.0.pinion.partNumber',
    ],
    [
      'an unknown part',
      { stages: [{ pinion: { partNumber: 'KW-99999' } }, {}] },
      'stages.0.pinion.partNumber',
    ],
    [
      'a part number of 100,000 characters',
      { stages: [{ pinion: { partNumber: 'x'.repeat(100_000) } }, {}] },
      'stages.0.pinion.partNumber',
    ],
    [
      'a part number that is a number',
      { stages: [{ pinion: { partNumber: 7 } }, {}] },
      'stages.0.pinion.partNumber',
    ],
    ['too few stages', { stages: [{}] }, 'stages'],
    ['too many stages', { stages: [{}, {}, {}, {}] }, 'stages'],
    ['stages that are no list', { stages: {} }, 'stages'],
    ['a stage that is null', { stages: [null, {}] }, 'stages'],
    ['another hand of a spur gear', { stages: [{ pinion: { hand: 'left' } }, {}] }, 'stages.0.pinion.hand'],
    ['a third hand', { stages: [{ pinion: { hand: 'both' } }, {}] }, 'stages.0.pinion.hand'],
    ['teeth, which are the option’s', { stages: [{ pinion: { teeth: 12 } }, {}] }, 'stages.0.pinion.teeth'],
    ['a diameter of 0', { shaftDiameters: [0, null, null] }, 'shaftDiameters.0'],
    ['a diameter as text', { shaftDiameters: ['12', null, null] }, 'shaftDiameters.0'],
    ['a diameter as an object', { shaftDiameters: [{}, null, null] }, 'shaftDiameters.0'],
    ['a shaft thicker than its pinion', { shaftDiameters: [400, null, null] }, 'shaftDiameters.0'],
    ['one diameter too few', { shaftDiameters: [null, null] }, 'shaftDiameters'],
    ['a blank title', { title: '  ' }, 'title'],
    ['a title of 100,000 characters', { title: 'x'.repeat(100_000) }, 'title'],
    ['no version', { version: undefined }, 'version'],
    ['a version in words', { version: 'latest' }, 'version'],
  ])('refuses %s, naming the field, and keeps what was', async (_, body, field) => {
    const sent = JSON.parse(JSON.stringify(body).replace('#stock', stockNumber)) as object;
    const version = 'version' in body ? body.version : train.version;
    const answer = await designer.patch<Refusal>(path(), { ...sent, version });
    expect(answer.status).toBe(400);
    const fields = answer.body.errors?.map((error) => error.field) ?? [];
    expect(fields.some((name) => name === field || name.startsWith(`${field}.`))).toBe(true);
    expect((await designer.get<TrainDto>(path())).body).toEqual(train);
  });
});
