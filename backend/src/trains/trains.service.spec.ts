import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { AuditService } from '../audit/audit.service.js';
import { type SignedInUser } from '../auth/signed-in-user.js';
import { BriefReader } from '../briefs/brief-reader.js';
import { BriefsService } from '../briefs/briefs.service.js';
import { PinsService } from '../briefs/pins.service.js';
import { PartsService } from '../parts/parts.service.js';
import { newRequirement } from '../testing/new-brief.js';
import { LIBRARIAN, newGear } from '../testing/new-part.js';
import { newSearchedBrief, newTrain } from '../testing/new-train.js';
import { addSignedIn } from '../testing/people.js';
import { openTempApp, type TempApp } from '../testing/temp-app.js';
import { BomService } from './bom.service.js';
import { TrainReader } from './train-reader.js';
import { TrainsService } from './trains.service.js';

let temp: TempApp;
let trains: TrainsService;
let ada: SignedInUser;

beforeAll(async () => {
  temp = await openTempApp();
  trains = temp.app.get(TrainsService);
  ada = await addSignedIn(temp.app, 'designer');
});
afterAll(() => temp.close());

describe('an adopted train', () => {
  it('is revision A, working, and its figures are those of the option', async () => {
    const search = await newSearchedBrief(temp.app, ada, { title: 'Vent drive' });
    const option = search.outcome?.options[0];
    const train = await trains.adopt(
      { briefId: search.briefId, searchId: search.id, optionKey: option?.key ?? '' },
      ada,
    );
    expect(train).toMatchObject({ revision: 'A', state: 'working', title: 'Vent drive', owner: ada.name });
    expect(train.figures).toMatchObject({
      ratio: option?.ratio,
      centreDistanceSum: option?.centreDistanceSum,
      mass: option?.mass,
      box: option?.box,
    });
    expect(train.figures.meshes.map((mesh) => mesh.contactRatio)).toEqual(
      option?.stages.map((stage) => stage.contactRatio),
    );
    const brief = await temp.app.get(BriefReader).get(search.briefId);
    expect(brief.standing).toBe('adopted');
    expect(brief.trains).toEqual([{ code: train.code, title: 'Vent drive' }]);
  });

  it('sizes its shafts by the torque: 16·1000·K_A·T/(π·25 MPa), rounded up', async () => {
    const requirement = newRequirement({
      duty: { outputTorque: 10, inputSpeed: 1400, applicationFactor: 1.5 },
    });
    const train = await newTrain(temp.app, ada, { requirement });
    const least = Math.ceil(((16 * 1000 * 1.5 * 10) / (Math.PI * 25)) ** (1 / 3));
    expect(train.figures.shafts.at(-1)?.leastDiameter).toBe(least);
    // 15 mm is a bearing bore of ISO 15.
    expect(least).toBe(15);
    expect(train.spec.shafts.at(-1)).toEqual({ diameter: 15, basis: 'torque' });
    expect(train.figures.checks.filter(({ code }) => code === 'shaft-diameter')).toHaveLength(
      train.spec.shafts.length,
    );
  });

  it('says so when a shaft cannot be as thick as its torque asks', async () => {
    const train = await newTrain(temp.app, ada, {
      requirement: newRequirement({ duty: { outputTorque: 900 } }),
    });
    const thin = train.figures.checks.filter(
      ({ code, verdict }) => code === 'shaft-diameter' && verdict === 'fails',
    );
    expect(thin.length).toBeGreaterThan(0);
    expect(train.fails).toBeGreaterThanOrEqual(thin.length);
  });

  it('takes stock gears that are exactly its gears, and their bores where no torque is known', async () => {
    const search = await newSearchedBrief(temp.app, ada);
    const option = search.outcome?.options[0];
    const [first] = option?.stages ?? [];
    if (!option || !first) throw new Error('no option');
    const attributes = {
      teeth: first.pinionTeeth,
      module: first.module,
      faceWidth: first.faceWidth,
      profileShift: 0,
      bore: 6,
      hubLength: 8,
    };
    const parts = temp.app.get(PartsService);
    const add = (changes: object, standing: 'draft' | 'cleared' = 'cleared') =>
      parts.create(LIBRARIAN, newGear({ standing, attributes: { ...attributes, ...changes } }));
    await add({ profileShift: 0.3 });
    await add({ faceWidth: first.faceWidth - 1 });
    await add({}, 'draft');
    const fitting = await add({});
    await add({});
    const train = await trains.adopt(
      { briefId: search.briefId, searchId: search.id, optionKey: option.key },
      ada,
    );
    expect(train.spec.stages[0]?.pinion.partNumber).toBe(fitting.number);
    expect(train.spec.shafts[0]).toEqual({ diameter: 6, basis: 'bore' });
    const { lines } = await temp.app.get(BomService).ofTrain(train.code);
    expect(lines.find((line) => line.source.includes('Stage 1 pinion'))?.partNumber).toBe(fitting.number);
    // DIN 6885-1: bore 6 takes a key 2 × 2; the longest standard length within face width 10 and hub 8 is 18 mm.
    const keys = lines.filter(({ kind, source }) => kind === 'key' && source.includes('Stage 1 pinion'));
    expect(first.faceWidth).toBe(10);
    expect(keys.map(({ description }) => description)).toEqual([expect.stringMatching(/2 × 2 × 18/)]);

    await parts.update(LIBRARIAN, fitting.number, { version: 1, standing: 'withdrawn' });
    const later = await temp.app.get(TrainReader).get(train.code);
    expect(later.figures.findings).toContainEqual(
      expect.objectContaining({ code: 'part-not-cleared', severity: 'marginal', stage: 0 }),
    );
  });

  it('has opposite hands in every helical stage, and one hand on a shaft between two stages', async () => {
    const train = await newTrain(temp.app, ada, { requirement: newRequirement({ helixAngleDeg: 15 }) });
    const hands = train.spec.stages.map(({ pinion, wheel }) => [pinion.hand, wheel.hand]);
    expect(hands.length).toBeGreaterThan(1);
    expect(hands).toEqual(hands.map((_, stage) => (stage % 2 === 0 ? ['right', 'left'] : ['left', 'right'])));
  });

  it('can be made of a pin although the brief changed since', async () => {
    const search = await newSearchedBrief(temp.app, ada);
    const optionKey = search.outcome?.options[1]?.key ?? '';
    await temp.app.get(PinsService).pin(search.briefId, optionKey, search.id, ada);
    const requirement = newRequirement({ ratio: { target: '20', tolerancePercent: '1' } });
    await temp.app.get(BriefsService).edit(search.briefId, { version: 1, requirement }, ada);
    const train = await trains.adopt({ briefId: search.briefId, searchId: search.id, optionKey }, ada);
    expect(train.spec.target?.ratio).toBe('12');
  });

  it.each([
    ['brief', { briefId: '999' }],
    ['search', { searchId: '999' }],
    ['option', { optionKey: '1/1m1' }],
  ])('cannot be made of an unknown %s', async (_, changes) => {
    const search = await newSearchedBrief(temp.app, ada);
    const optionKey = search.outcome?.options[0]?.key ?? '';
    const adopting = trains.adopt(
      { briefId: search.briefId, searchId: search.id, optionKey, ...changes },
      ada,
    );
    await expect(adopting).rejects.toMatchObject({ statusCode: 404 });
  });
});

describe('changing a train', () => {
  it('counts the version up, and refuses an older one with the present state', async () => {
    const { code, spec } = await newTrain(temp.app, ada);
    const diameters = [
      spec.shafts[0] ? spec.shafts[0].diameter + 1 : null,
      ...spec.shafts.slice(1).map(() => null),
    ];
    const changed = await trains.edit(code, { version: 1, title: 'Renamed', shaftDiameters: diameters }, ada);
    expect(changed).toMatchObject({ version: 2, title: 'Renamed' });
    expect(changed.spec.shafts[0]).toEqual({ diameter: diameters[0], basis: 'typed' });
    await expect(trains.edit(code, { version: 1, title: 'Late' }, ada)).rejects.toMatchObject({
      statusCode: 409,
      extra: { current: { title: 'Renamed', version: 2 } },
    });
    const { items } = await temp.app.get(AuditService).changesOf('train', code, {});
    expect(items.map(({ action }) => action)).toEqual(['changed', 'adopted']);
  });
});

describe('the list of trains', () => {
  it('finds by text and owner, where % means itself', async () => {
    await newTrain(temp.app, ada, { title: 'Seaweed 100%' });
    const page = await temp.app
      .get(TrainReader)
      .page({ text: '100%', mine: true, sort: '-createdAt' }, ada.id);
    expect(page.items).toMatchObject([{ title: 'Seaweed 100%', brief: { title: 'Seaweed 100%' } }]);
    expect((await temp.app.get(TrainReader).page({ mine: true }, 'nobody')).total).toBe(0);
  });
});
