import { existsSync } from 'node:fs';
import { fileURLToPath } from 'node:url';
import fastifyStatic from '@fastify/static';
import { type FastifyInstance, type FastifyReply, type FastifyRequest } from 'fastify';

/** Where the front end's build lies, seen from `backend/src/http` and `backend/dist/http` alike. */
const SCREENS = fileURLToPath(new URL('../../../frontend/dist', import.meta.url));

const NOT_BUILT = 'The screens are not built yet. Run npm start, or npm run build, then reload.';

/** Serves the built front end: its files, and the one page for every address that is not the API's. */
export async function serveScreens(server: FastifyInstance, root = SCREENS): Promise<void> {
  const isBuilt = existsSync(`${root}/index.html`);
  if (isBuilt) {
    await server.register(fastifyStatic, {
      root,
      wildcard: false,
      index: 'index.html',
      setHeaders: (reply, path) => {
        // Built files carry a hash of their content in their name; the page that names them does not.
        const isHashed = path.includes('/assets/');
        void reply.header('cache-control', isHashed ? 'public, max-age=31536000, immutable' : 'no-cache');
      },
    });
  }
  server.get('/*', (request: FastifyRequest, reply: FastifyReply) => {
    if (/^\/(api|assets)(\/|\?|$)/.test(request.url)) return reply.callNotFound();
    if (isBuilt) return reply.header('cache-control', 'no-cache').sendFile('index.html');
    return reply.status(503).type('text/plain; charset=utf-8').send(NOT_BUILT);
  });
}
