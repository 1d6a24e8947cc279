import { RequestMethod } from '@nestjs/common';
import { METHOD_METADATA, PATH_METADATA } from '@nestjs/common/constants.js';
import { type DiscoveryService, type MetadataScanner, type Reflector } from '@nestjs/core';
import { ACCESS } from './allow.decorator.js';

/**
 * Every route says who may call it.
 * @throws Error naming each route that does not
 */
export function assertDeclaredAccess(
  discovery: DiscoveryService,
  scanner: MetadataScanner,
  reflector: Reflector,
): void {
  const open: string[] = [];
  for (const { metatype } of discovery.getControllers()) {
    if (typeof metatype !== 'function') continue;
    const prototype = metatype.prototype as Record<string, unknown>;
    for (const name of scanner.getAllMethodNames(prototype)) {
      const handler = prototype[name];
      if (typeof handler !== 'function' || !Reflect.hasMetadata(PATH_METADATA, handler)) continue;
      if (reflector.getAllAndOverride<unknown>(ACCESS, [handler, metatype]) !== undefined) continue;
      const method = RequestMethod[Reflect.getMetadata(METHOD_METADATA, handler) as number];
      open.push(`${metatype.name}.${name} (${method})`);
    }
  }
  if (open.length === 0) return;
  throw new Error(
    `These routes do not say who may call them; add @Allow, @SignedIn or @Public: ${open.join(', ')}`,
  );
}
