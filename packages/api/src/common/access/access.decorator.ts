import { applyDecorators, createParamDecorator, type ExecutionContext, SetMetadata } from '@nestjs/common';
import { ApiBearerAuth, ApiExtension } from '@nestjs/swagger';
import { type Actor as ActorType, type Role, ROLES } from '@rivetside/shared';
import type { FastifyRequest } from 'fastify';

export const ACCESS_ROLES = 'access:roles';
export type AccessRole = Role | 'authenticated';

/** What the guard reads and what the OpenAPI document says are one thing. */
const declare = (roles: readonly AccessRole[]) =>
  applyDecorators(SetMetadata(ACCESS_ROLES, roles), ApiExtension('x-roles', [...roles]));

/** Who may come in. Roles say who may in principle succeed; policies decide on the thing itself. */
export const Access = (...roles: [AccessRole, ...AccessRole[]]) =>
  applyDecorators(declare(roles), ApiBearerAuth());

/** For everybody, signed in or not. */
export const Public = () => declare(ROLES);

export type SignedInRequest = FastifyRequest & { user: ActorType };

/** Whoever is signed in, as policies see them. */
export const Actor = createParamDecorator(
  (_: unknown, context: ExecutionContext): ActorType =>
    context.switchToHttp().getRequest<SignedInRequest>().user,
);
