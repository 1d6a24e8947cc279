import { openBenchServer } from './bench-server.mjs';
import { benchLists } from './lists.mjs';
import { benchLoading } from './loading.mjs';

/** Parts of the scale set; another number may follow on the command line. */
const PARTS = 250_000;

/** Runs on the built server and seed (`npm run bench` builds them): one process serves and loads, this one asks. */
const count = Number(process.argv[2] ?? PARTS);
const server = await openBenchServer();
// Broken off by hand, it still takes its server and its folder with it.
for (const signal of ['SIGINT', 'SIGTERM']) {
  process.once(signal, () => void server.close().then(() => process.exit(1)));
}
try {
  const results = [await benchLoading(server, count), await benchLists(server)];
  if (results.includes(false)) {
    console.log('A result differs from what it was compared with.');
    process.exitCode = 1;
  }
} finally {
  await server.close();
}
