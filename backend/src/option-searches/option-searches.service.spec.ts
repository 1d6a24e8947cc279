import { setTimeout as delay } from 'node:timers/promises';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { BriefReader } from '../briefs/brief-reader.js';
import { BriefsService } from '../briefs/briefs.service.js';
import { PinsService } from '../briefs/pins.service.js';
import { type SignedInUser } from '../auth/signed-in-user.js';
import { createApp } from '../app.js';
import { WriteQueue } from '../database/write-queue.js';
import { impossibleRequirement, newBrief, newRequirement, slowRequirement } from '../testing/new-brief.js';
import { addSignedIn } from '../testing/people.js';
import { searchEnded } from '../testing/new-train.js';
import { openTempApp, type TempApp } from '../testing/temp-app.js';
import { tempSettings } from '../testing/temp-settings.js';
import { type SearchDto } from './dto/search.dto.js';
import { OptionSearch } from './entities/option-search.entity.js';
import { OptionSearchesService } from './option-searches.service.js';

let temp: TempApp;
let searches: OptionSearchesService;
let briefs: BriefsService;
let ada: SignedInUser;
let ben: SignedInUser;

beforeAll(async () => {
  temp = await openTempApp();
  searches = temp.app.get(OptionSearchesService);
  briefs = temp.app.get(BriefsService);
  [ada, ben] = [await addSignedIn(temp.app, 'designer'), await addSignedIn(temp.app, 'designer')];
});
afterAll(() => temp.close());

const ended = (id: string) => searchEnded(temp.app, id);

async function running(id: string): Promise<SearchDto> {
  for (;;) {
    const search = await searches.get(id);
    if (search.state === 'running' && search.progress) return search;
    expect(['queued', 'running']).toContain(search.state);
    await delay(20);
  }
}

describe('a search of a brief', () => {
  it('is kept with what was asked and what came out, and the brief says so', async () => {
    const brief = await briefs.create(newBrief(), ada);
    const { id, state } = await searches.start(brief.id, ada);
    expect(state).toBe('queued');
    const search = await ended(id);
    expect(search).toMatchObject({
      state: 'done',
      optionCount: 5,
      complete: true,
      message: null,
      by: ada.name,
    });
    expect(search.request).toEqual(brief.requirement);
    expect(search.outcome?.options.every((option) => Math.abs(option.ratio.errorPercent ?? 9) <= 1)).toBe(
      true,
    );
    expect(await temp.app.get(BriefReader).get(brief.id)).toMatchObject({
      standing: 'searched',
      version: 1,
      latestSearch: { id, state: 'done' },
    });
  });

  it('that nobody can meet is done, without options and with the reasons', async () => {
    const brief = await briefs.create(newBrief({ requirement: impossibleRequirement() }), ada);
    const search = await ended((await searches.start(brief.id, ada)).id);
    expect(search).toMatchObject({ state: 'done', optionCount: 0, complete: true });
    const reasons = search.outcome?.whyNot ?? [];
    expect(new Set(reasons.map(({ stages }) => stages))).toEqual(new Set([1, 2]));
    expect(reasons.every(({ message }) => message.length > 20)).toBe(true);
  });

  it('belongs to the requirement that was searched, not to a later one', async () => {
    const brief = await briefs.create(newBrief(), ada);
    await ended((await searches.start(brief.id, ada)).id);
    const requirement = newRequirement({ ratio: { target: '13', tolerancePercent: '1' } });
    const edited = await briefs.edit(brief.id, { version: 1, requirement }, ada);
    expect(edited.standing).toBe('open');
    expect(edited.latestSearch?.briefVersion).toBe(1);
    expect(edited.version).toBe(2);
  });

  it('can be stopped, by anybody who edits briefs, and keeps what it found', async () => {
    const brief = await briefs.create(newBrief({ requirement: slowRequirement() }), ada);
    const { id } = await searches.start(brief.id, ada);
    await running(id);
    await searches.stop(id, ben);
    const search = await ended(id);
    expect(search).toMatchObject({ state: 'stopped', complete: false });
    expect(search.optionCount).toBe(search.outcome?.options.length);
    expect(search.message).toMatch(/Stopped before every combination/);
    // A second stop changes nothing.
    expect((await searches.stop(id, ben)).state).toBe('stopped');
  });

  it('is the only one its person has, and says which runs', async () => {
    const slow = await briefs.create(newBrief({ title: 'Slow one', requirement: slowRequirement() }), ada);
    const other = await briefs.create(newBrief(), ada);
    const first = await searches.start(slow.id, ada);
    await expect(searches.start(other.id, ada)).rejects.toMatchObject({
      statusCode: 409,
      code: 'search-running',
      message: expect.stringContaining('“Slow one”') as string,
      extra: { searchId: first.id, briefId: slow.id },
    });
    const bens = await searches.start(other.id, ben);
    await searches.stop(first.id, ada);
    await ended(first.id);
    expect((await ended(bens.id)).state).toBe('done');
    expect((await ended((await searches.start(other.id, ada)).id)).state).toBe('done');
  });
});

describe('the stream of a search', () => {
  it('begins with the present state, tells of progress and ends with the end', async () => {
    const brief = await briefs.create(newBrief({ requirement: slowRequirement() }), ada);
    const { id } = await searches.start(brief.id, ada);
    await running(id);
    const heard: [string | undefined, unknown][] = [];
    const stream = await searches.events(id);
    const over = new Promise<void>((resolve, reject) => {
      stream.subscribe({
        next: ({ type, data }) => heard.push([type, data]),
        complete: resolve,
        error: reject,
      });
    });
    expect(heard[0]).toEqual(['state', expect.objectContaining({ id, state: 'running' })]);
    expect(heard[1]?.[0]).toBe('progress');
    await searches.stop(id, ada);
    await over;
    expect(heard.at(-1)).toEqual(['state', expect.objectContaining({ state: 'stopped' })]);
  });
});

describe('pins', () => {
  it('keep a copy of the option, at most twelve', async () => {
    const pins = temp.app.get(PinsService);
    const requirement = newRequirement({ limit: 20, ratio: { target: '12', tolerancePercent: '3' } });
    const brief = await briefs.create(newBrief({ requirement }), ada);
    const search = await ended((await searches.start(brief.id, ada)).id);
    const options = search.outcome?.options ?? [];
    expect(options.length).toBeGreaterThan(12);
    for (const { key } of options.slice(0, 12)) await pins.pin(brief.id, key, search.id, ada);
    const again = await pins.pin(brief.id, options[0]?.key ?? '', search.id, ben);
    expect(again.pins.map(({ key }) => key)).toEqual(options.slice(0, 12).map(({ key }) => key));
    expect(again.pins[0]).toMatchObject({ by: ada.name, option: options[0] });
    const thirteenth = pins.pin(brief.id, options[12]?.key ?? '', search.id, ada);
    await expect(thirteenth).rejects.toMatchObject({ statusCode: 409, code: 'too-many-pins' });
    const fewer = await pins.unpin(brief.id, options[3]?.key ?? '', ben);
    expect(fewer.pins).toHaveLength(11);
    await expect(pins.pin(brief.id, 'no/such', search.id, ada)).rejects.toMatchObject({ statusCode: 404 });
  });

  it('come only from searches of the same brief', async () => {
    const pins = temp.app.get(PinsService);
    const one = await briefs.create(newBrief(), ada);
    const two = await briefs.create(newBrief(), ada);
    const search = await ended((await searches.start(one.id, ada)).id);
    const key = search.outcome?.options[0]?.key ?? '';
    await expect(pins.pin(two.id, key, search.id, ada)).rejects.toMatchObject({ statusCode: 404 });
  });
});

describe('a server that stops', () => {
  it('fails the search under way with the reason, and nothing writes afterwards', async () => {
    const { settings, remove } = tempSettings();
    const app = await createApp(settings);
    const person = await addSignedIn(app, 'designer');
    const brief = await app.get(BriefsService).create(newBrief({ requirement: slowRequirement() }), person);
    const { id } = await app.get(OptionSearchesService).start(brief.id, person);
    await app.close();
    const again = await createApp(settings);
    const search = await again.get(OptionSearchesService).get(id);
    expect(search).toMatchObject({ state: 'failed', outcome: null });
    expect(search.message).toMatch(/server stopped/);
    await again.close();
    remove();
  });

  it('finds what a dead server left behind', async () => {
    const { settings, remove } = tempSettings();
    const app = await createApp(settings);
    const person = await addSignedIn(app, 'designer');
    const brief = await app.get(BriefsService).create(newBrief(), person);
    const { id } = await app.get(WriteQueue).run((manager) =>
      manager.save(OptionSearch, {
        briefId: Number(brief.id),
        briefVersion: 1,
        state: 'running',
        request: newRequirement(),
        startedById: person.id,
        startedAt: new Date().toISOString(),
      }),
    );
    await app.close();
    // As if the process had been killed: the row still says that it runs.
    const killed = await createApp(settings);
    await killed.get(WriteQueue).run((manager) => manager.update(OptionSearch, { id }, { state: 'running' }));
    await killed.close();
    const again = await createApp(settings);
    expect(await again.get(OptionSearchesService).get(String(id))).toMatchObject({ state: 'failed' });
    const next = await again.get(OptionSearchesService).start(brief.id, person);
    expect(next.state).toBe('queued');
    await again.close();
    remove();
  });
});
