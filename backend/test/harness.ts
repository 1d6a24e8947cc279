import { type NestFastifyApplication } from '@nestjs/platform-fastify';
import { type OpenAPIObject } from '@nestjs/swagger';
import { type Role, ROLES } from '../src/auth/permissions.js';
import { apiDocument } from '../src/openapi-document.js';
import { type Settings } from '../src/settings/settings.js';
import { addPerson } from '../src/testing/people.js';
import { openTempApp } from '../src/testing/temp-app.js';
import { Client } from './client.js';
import { ResponseChecker } from './response-checker.js';

export { type Answer, Client } from './client.js';
export { ROLES, type Role };

export interface TestServer {
  app: NestFastifyApplication;
  settings: Settings;
  url: string;
  document: OpenAPIObject;
  /** Nobody signed in. */
  anonymous(): Client;
  /** A person of that role, signed in once and kept. */
  as(role: Role): Promise<Client>;
  /** A person of that role with a session of their own, for tests that end it. */
  asAnother(role: Role): Promise<Client>;
  close(): Promise<void>;
}

/** A real server on this machine, a free port and an empty data folder. Every answer is checked. */
export async function startServer(changes: Partial<Settings> = {}): Promise<TestServer> {
  const { app, settings, close } = await openTempApp(changes);
  await app.listen({ host: settings.host, port: settings.port });
  const url = (await app.getUrl()).replace('[::1]', '127.0.0.1');
  const document = apiDocument(app);
  const checker = new ResponseChecker(document);
  const anonymous = () => new Client(url, checker);
  const asAnother = async (role: Role) => {
    const { email } = await addPerson(app, { roles: [role], name: `Test ${role}` });
    return anonymous().signIn(email);
  };
  const known = new Map<Role, Promise<Client>>();
  return {
    app,
    settings,
    url,
    document,
    anonymous,
    asAnother,
    as: (role) => {
      const client = known.get(role) ?? asAnother(role);
      known.set(role, client);
      return client;
    },
    close,
  };
}
