import { inMs, printTable } from '../../libs/bench/timing.mjs';
import { keepAsking, summary } from './request-log.mjs';

/** Loads a scale set while people go on asking. @returns whether it came in whole, in time and without a long hold */
export async function benchLoading(server, count) {
  const finish = await keepAsking(server);
  const { loaded, seconds, loop } = await server.ask({ kind: 'load', count }, 'loaded');
  const log = await finish();
  const rows = ['read', 'write'].map((kind) => {
    const { count: asked, refused, p50, p99, max } = summary(log, kind);
    return [`${kind}s while loading`, asked, refused, inMs(p50), inMs(p99), inMs(max)];
  });
  console.log(
    `Loading ${loaded.parts.toLocaleString('en-GB')} parts, ${loaded.offers.toLocaleString('en-GB')} offers and ` +
      `${loaded.counts.toLocaleString('en-GB')} opening counts into a serving server.\n` +
      `Meanwhile two people ask for pages, each a tenth of a second after the last, and one changes a part four times a second`,
  );
  printTable([['', 'requests', 'refused', 'half within', '99 % within', 'longest'], ...rows]);
  const { body } = await server.request('GET', '/api/parts?text=pattern&size=1');
  const all = await server.request('GET', '/api/parts?size=1');
  const whole = loaded.parts === count && all.body.total === count + 1 && body.total > count / 2;
  const refused = log.some(({ status }) => status !== 200);
  const verdict = (ok) => (ok ? 'yes' : 'NO');
  printTable([
    ['', 'measured', 'goal', 'reached'],
    ['loading time', `${seconds.toFixed(1)} s`, 'under 60 s', verdict(seconds < 60)],
    [
      'longest hold of the loop by the server itself',
      inMs(loop.hold),
      'at most 50 ms',
      verdict(loop.hold <= 50),
    ],
    ['longest gap, waiting for a processor included', inMs(loop.gap), '', ''],
    ['every part there, nobody refused', verdict(whole && !refused), 'yes', verdict(whole && !refused)],
  ]);
  return whole && !refused;
}
