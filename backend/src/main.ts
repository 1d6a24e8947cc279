import { type NestFastifyApplication } from '@nestjs/platform-fastify';
import type { OpeningService } from './auth/opening.service.js';
import { folderProblem } from './database/storage-problem.js';
import { loadSettings, type Settings, SettingsError } from './settings/settings.js';

/** Leaves with a plain sentence and without a stack trace. */
function leave(message: string): never {
  process.stderr.write(`${message}\n`);
  process.exit(1);
}

function readSettings(): Settings {
  try {
    return loadSettings(process.env);
  } catch (error) {
    if (error instanceof SettingsError) leave(error.message);
    throw error;
  }
}

function listenProblem(error: unknown, { host, port }: Settings): string | null {
  const code = error instanceof Error && 'code' in error ? error.code : '';
  if (code === 'EADDRINUSE') {
    return `Port ${port} on ${host} is in use. Stop the program that uses it, or set PORT to another number.`;
  }
  if (code === 'EACCES' && port < 1024) return `Port ${port} needs more rights. Set PORT to 1024 or more.`;
  if (code === 'EADDRNOTAVAIL' || code === 'ENOTFOUND') {
    return `HOST is ${host}, which is no address of this machine. Use 127.0.0.1.`;
  }
  return null;
}

async function announce(
  app: NestFastifyApplication,
  settings: Settings,
  opening: OpeningService,
): Promise<void> {
  const address = app.getHttpServer().address();
  const port = typeof address === 'object' && address !== null ? address.port : settings.port;
  const host = settings.host.includes(':') ? `[${settings.host}]` : settings.host;
  const base = settings.publicUrl ?? `http://${host}:${port}`;
  process.stdout.write(`Stageyard listens at ${base}${settings.demo ? ' (demo mode)' : ''}\n`);
  const path = await opening.firstAdminPath();
  if (path === null) return;
  process.stdout.write(
    `Nobody can sign in yet. Open this link once to become administrator:\n${base}${path}\n`,
  );
}

/** Ctrl-C under npm arrives twice, from the terminal and from npm: signals this close together are one. */
const ONE_SIGNAL_MS = 1_000;

/** Takes no more requests, lets running ones and queued writes finish, then leaves; a later signal leaves at once. */
function endOnSignals(app: NestFastifyApplication): void {
  let since: number | null = null;
  const end = () => {
    if (since !== null) {
      if (performance.now() - since > ONE_SIGNAL_MS) process.exit(1);
      return;
    }
    since = performance.now();
    app.close().then(
      () => process.exit(0),
      (error: unknown) => leave(`Stageyard did not close cleanly: ${String(error)}`),
    );
  };
  for (const signal of ['SIGTERM', 'SIGINT'] as const) process.on(signal, end);
}

const settings = readSettings();
// Read only now, so that bad settings are told of at once.
const { createApp } = await import('./app.js');
const { OpeningService: Opening } = await import('./auth/opening.service.js');
const app = await createApp(settings).catch((error: unknown) =>
  leave(
    folderProblem(error, settings.dataDir) ??
      `Stageyard cannot start: ${error instanceof Error ? error.message : String(error)}`,
  ),
);
endOnSignals(app);
try {
  await app.listen({ host: settings.host, port: settings.port });
} catch (error) {
  await app.close();
  leave(listenProblem(error, settings) ?? `Stageyard cannot listen: ${String(error)}`);
}
await announce(app, settings, app.get(Opening));
