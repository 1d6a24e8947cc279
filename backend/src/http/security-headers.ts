import { type FastifyHelmetOptions } from '@fastify/helmet';
import { type Settings } from '../settings/settings.js';

/** Everything comes from our own server; only styles may stand in the page, since the theme writes them there. */
export function securityHeaders({ publicUrl }: Pick<Settings, 'publicUrl'>): FastifyHelmetOptions {
  const encrypted = publicUrl?.startsWith('https:') ?? false;
  return {
    contentSecurityPolicy: {
      useDefaults: false,
      directives: {
        defaultSrc: ["'self'"],
        scriptSrc: ["'self'"],
        styleSrc: ["'self'", "'unsafe-inline'"],
        imgSrc: ["'self'", 'data:', 'blob:'],
        fontSrc: ["'self'", 'data:'],
        connectSrc: ["'self'"],
        workerSrc: ["'self'", 'blob:'],
        objectSrc: ["'none'"],
        baseUri: ["'self'"],
        formAction: ["'self'"],
        frameAncestors: ["'none'"],
      },
    },
    hsts: encrypted ? { maxAge: 31_536_000 } : false,
    frameguard: { action: 'deny' },
    referrerPolicy: { policy: 'same-origin' },
    crossOriginEmbedderPolicy: false,
  };
}
