import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { type SignedInUser } from '../auth/signed-in-user.js';
import { AuditService } from '../audit/audit.service.js';
import { newBrief, newRequirement } from '../testing/new-brief.js';
import { addSignedIn } from '../testing/people.js';
import { openTempApp, type TempApp } from '../testing/temp-app.js';
import { BriefReader } from './brief-reader.js';
import { BriefsService } from './briefs.service.js';

let temp: TempApp;
let briefs: BriefsService;
let reader: BriefReader;
let ada: SignedInUser;
let ben: SignedInUser;

beforeAll(async () => {
  temp = await openTempApp();
  briefs = temp.app.get(BriefsService);
  reader = temp.app.get(BriefReader);
  [ada, ben] = [await addSignedIn(temp.app, 'designer'), await addSignedIn(temp.app, 'designer')];
});
afterAll(() => temp.close());

describe('briefs', () => {
  it('get running codes and belong to who wrote them', async () => {
    const first = await briefs.create(newBrief({ title: 'Winch' }), ada);
    const second = await briefs.create(newBrief({ title: 'Turntable' }), ben);
    expect(second.code).toBe(`B-${String(Number(first.code.slice(2)) + 1).padStart(4, '0')}`);
    expect(first).toMatchObject({
      owner: ada.name,
      standing: 'open',
      version: 1,
      pins: [],
      latestSearch: null,
    });
  });

  it('change only what a patch names, and tell who changed what', async () => {
    const { id, code, requirement } = await briefs.create(
      newBrief({ title: 'Before', note: 'keep me' }),
      ada,
    );
    const edited = await briefs.edit(id, { version: 1, title: 'After' }, ben);
    expect(edited).toMatchObject({
      title: 'After',
      note: 'keep me',
      requirement,
      version: 2,
      owner: ada.name,
    });
    const { items } = await temp.app.get(AuditService).changesOf('brief', code, {});
    expect(items.map(({ action, by }) => [action, by])).toEqual([
      ['changed', ben.name],
      ['added', ada.name],
    ]);
    expect(items[0]).toMatchObject({ before: { title: 'Before' }, after: { title: 'After' } });
  });

  it('refuse an edit of a version that is gone, showing how it stands, and change nothing', async () => {
    const { id } = await briefs.create(newBrief(), ada);
    await briefs.edit(id, { version: 1, title: 'Mine' }, ada);
    const late = briefs.edit(id, { version: 1, title: 'Late', note: 'lost?' }, ben);
    await expect(late).rejects.toMatchObject({
      statusCode: 409,
      code: 'changed-meanwhile',
      extra: { current: { title: 'Mine', version: 2 } },
    });
    expect(await reader.get(id)).toMatchObject({ title: 'Mine', note: '', version: 2 });
  });

  it('refuse a bad requirement before anything is written', async () => {
    const before = await reader.count();
    const requirement = newRequirement({ modules: [] });
    await expect(briefs.create(newBrief({ requirement }), ada)).rejects.toMatchObject({ statusCode: 400 });
    expect(await reader.count()).toBe(before);
  });

  it.each(['0', '-1', '1.5', 'abc', '999999', '1e3', ' 1', '99999999999999999999'])(
    'do not know the id “%s”',
    async (id) => {
      await expect(reader.get(id)).rejects.toMatchObject({ statusCode: 404 });
    },
  );
});

describe('the list of briefs', () => {
  it('finds by text where % and _ mean themselves', async () => {
    await briefs.create(newBrief({ title: 'Runs at 90%_load' }), ada);
    const titles = async (text: string) =>
      (await reader.page({ text }, ada.id)).items.map(({ title }) => title);
    expect(await titles('90%_LOAD')).toEqual(['Runs at 90%_load']);
    expect(await titles('9%_')).toEqual([]);
    expect((await reader.find('90%', 8)).map(({ title }) => title)).toEqual(['Runs at 90%_load']);
  });

  it('shows mine only when asked, sorts by two keys and pages', async () => {
    const all = await reader.page({ size: 100 }, ben.id);
    const mine = await reader.page({ mine: true, sort: '-title,code', size: 1, page: 1 }, ben.id);
    expect(mine.total).toBeLessThan(all.total);
    expect(mine.items).toHaveLength(1);
    const titles = all.items.filter((brief) => brief.owner === ben.name).map(({ title }) => title);
    expect(mine.items[0]?.title).toBe(titles.sort().reverse()[0]);
  });

  it('refuses to sort by what it does not have', async () => {
    await expect(reader.page({ sort: 'requirement' }, ada.id)).rejects.toMatchObject({ statusCode: 400 });
  });
});
