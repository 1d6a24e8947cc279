// The server of the bench: serves a data folder, and loads a scale set into it when it is told to.
import { createApp } from '../dist/app.js';
import { loadSettings } from '../dist/settings/settings.js';
import { bookScale } from '../../seed/dist/scale/load-scale.js';
import { PartsReader } from '../dist/parts/parts-reader.service.js';
import { watchLoop } from './loop-watch.mjs';

const app = await createApp(loadSettings(process.env));
await app.listen({ host: '127.0.0.1', port: 0 });
process.send({ kind: 'listening', url: await app.getUrl() });

let endWatch = null;
process.on('message', async (message) => {
  if (message.kind === 'list') {
    const start = performance.now();
    const { items, total } = await app.get(PartsReader).list(message.query);
    const ms = performance.now() - start;
    process.send({ kind: 'listed', ms, total, numbers: items.map(({ number }) => number) });
  }
  if (message.kind === 'watch') endWatch = watchLoop();
  if (message.kind === 'watched') process.send({ kind: 'loop', loop: endWatch() });
  if (message.kind !== 'load') return;
  const unwatch = watchLoop();
  const started = performance.now();
  try {
    const loaded = await bookScale(app, { count: message.count });
    const seconds = (performance.now() - started) / 1000;
    process.send({ kind: 'loaded', loaded, seconds, loop: unwatch() });
  } catch (error) {
    process.send({ kind: 'failed', message: String(error) });
  }
});
// The bench ends, however it ends: so does its server.
process.on('disconnect', () => app.close().then(() => process.exit(0)));
