import { type NestFastifyApplication } from '@nestjs/platform-fastify';
import { SwaggerModule } from '@nestjs/swagger';
import { readSessionCookie } from '../auth/session-cookie.js';
import { SessionsService } from '../auth/sessions.service.js';
import { forbidden, signedOut } from '../common/errors.js';
import { apiDocument } from '../openapi-document.js';
import { type Settings } from '../settings/settings.js';

const PLACE = /^\/api\/docs(-json)?([/?]|$)/;

/** The API's pages at `/api/docs` and its document at `/api/docs-json`: for everybody in demo mode, else for admins. */
export function serveApiDocs(app: NestFastifyApplication, settings: Settings): void {
  const sessions = app.get(SessionsService);
  app
    .getHttpAdapter()
    .getInstance()
    .addHook('onRequest', async (request) => {
      if (settings.demo || !PLACE.test(request.url)) return;
      const person = await sessions.personOf(readSessionCookie(request));
      if (!person) throw signedOut();
      if (!person.permissions.includes('people.manage')) throw forbidden();
    });
  SwaggerModule.setup('api/docs', app, () => apiDocument(app), {
    jsonDocumentUrl: 'api/docs-json',
    raw: ['json'],
    customSiteTitle: 'Stageyard API',
  });
}
