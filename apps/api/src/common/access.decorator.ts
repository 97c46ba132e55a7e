import { applyDecorators, createParamDecorator, type ExecutionContext, SetMetadata } from '@nestjs/common';
import { ApiBearerAuth, ApiExtension } from '@nestjs/swagger';
import type { Request } from 'express';

export const ROLES = ['owner', 'designer', 'carpenter', 'reviewer'] as const;
export type Role = (typeof ROLES)[number];

/** `link`: whoever holds the private link; the route's service reads the token. */
type OpenRule = 'public' | 'signed-in' | 'link';
export type AccessRule = readonly [OpenRule] | readonly [Role, ...Role[]];

export const ACCESS_RULE = 'access-rule';

export interface CurrentUserInfo {
  id: string;
  sessionId: string;
}

export interface MemberInfo {
  workshopId: string;
  userId: string;
  role: Role;
}

export interface AccessRequest extends Request {
  user?: CurrentUserInfo;
  member?: MemberInfo;
}

/**
 * Who may use a route. Every route has one: the application does not start otherwise. Roles are those
 * in the workshop that stands in the path as `:workshopId`; to anybody else the workshop does not exist.
 */
export function Access(...rule: AccessRule): ClassDecorator & MethodDecorator {
  const declared = [SetMetadata(ACCESS_RULE, rule), ApiExtension('x-access', rule)];
  const open = rule[0] === 'public' || rule[0] === 'link';
  return applyDecorators(...declared, ...(open ? [] : [ApiBearerAuth()]));
}

export const CurrentUser = createParamDecorator((_: unknown, context: ExecutionContext): CurrentUserInfo => {
  const { user } = context.switchToHttp().getRequest<AccessRequest>();
  if (!user) throw new Error('@CurrentUser() stands on a route that is open to everybody');
  return user;
});

/** On an open route: who asks, or null. */
export const PerhapsUser = createParamDecorator(
  (_: unknown, context: ExecutionContext): CurrentUserInfo | null =>
    context.switchToHttp().getRequest<AccessRequest>().user ?? null,
);

export const Member = createParamDecorator((_: unknown, context: ExecutionContext): MemberInfo => {
  const { member } = context.switchToHttp().getRequest<AccessRequest>();
  if (!member) throw new Error('@Member() stands on a route without workshop roles');
  return member;
});
