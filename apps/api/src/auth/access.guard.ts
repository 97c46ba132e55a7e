import { type ExecutionContext, Injectable } from '@nestjs/common';
import { Reflector } from '@nestjs/core';
import { AuthGuard } from '@nestjs/passport';
import { ACCESS_RULE, type AccessRequest, type AccessRule, type Role } from '../common/access.decorator';
import { Problem } from '../common/problem';

/** Stands before every route and lets nobody through whom the route's rule does not name. */
@Injectable()
export class AccessGuard extends AuthGuard('jwt') {
  constructor(private readonly reflector: Reflector) {
    super();
  }

  override async canActivate(context: ExecutionContext): Promise<boolean> {
    const rule = this.reflector.getAllAndOverride<AccessRule | undefined>(ACCESS_RULE, [
      context.getHandler(),
      context.getClass(),
    ]);
    if (!rule) return false;
    if (rule[0] === 'public' || rule[0] === 'link') {
      await this.recogniseIfSignedIn(context);
      return true;
    }
    await super.canActivate(context);
    if (rule[0] === 'signed-in') return true;
    return isMemberWith(rule as readonly Role[], context.switchToHttp().getRequest<AccessRequest>());
  }

  /** An open route may still want to know who asks, as when a signed-in person accepts an invitation. */
  private async recogniseIfSignedIn(context: ExecutionContext): Promise<void> {
    const { headers } = context.switchToHttp().getRequest<AccessRequest>();
    if (!headers.authorization) return;
    try {
      await super.canActivate(context);
    } catch {
      // An ended session is as good as none here.
    }
  }
}

function isMemberWith(roles: readonly Role[], { member }: AccessRequest): boolean {
  if (!member) throw Problem.notFound('workshop');
  if (!roles.includes(member.role)) {
    throw Problem.forbidden(
      'role-not-allowed',
      `This is for: ${roles.join(', ')}. Your role is ${member.role}.`,
    );
  }
  return true;
}
