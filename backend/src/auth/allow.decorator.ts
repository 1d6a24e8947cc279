import { applyDecorators, SetMetadata } from '@nestjs/common';
import { ApiExtension, ApiResponse } from '@nestjs/swagger';
import { Problem } from '../common/dto/problem.js';
import { type Permission } from './permissions.js';

/** Who may call a route: anybody, anybody signed in, or holders of a permission. */
export type Access = 'public' | 'signed-in' | Permission;

export const ACCESS = 'stageyard:access';

const SIGNED_OUT = ApiResponse({ status: 401, type: Problem, description: 'Nobody is signed in.' });
const NOT_ALLOWED = ApiResponse({ status: 403, type: Problem, description: 'The roles do not allow it.' });

/** The route is open to signed-in people who hold the permission; documented in OpenAPI as `x-permission`. */
export function Allow(permission: Permission): ClassDecorator & MethodDecorator {
  return applyDecorators(declare(permission), SIGNED_OUT, NOT_ALLOWED);
}

/** The route is open to everybody signed in, whatever their roles. */
export function SignedIn(): ClassDecorator & MethodDecorator {
  return applyDecorators(declare('signed-in'), SIGNED_OUT);
}

/** The route is open to everybody. */
export function Public(): ClassDecorator & MethodDecorator {
  return declare('public');
}

function declare(access: Access): ClassDecorator & MethodDecorator {
  return applyDecorators(SetMetadata(ACCESS, access), ApiExtension('x-permission', access));
}
