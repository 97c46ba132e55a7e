import { type ExecutionContext, Injectable } from '@nestjs/common';
import { Reflector } from '@nestjs/core';
import { AuthGuard } from '@nestjs/passport';
import { isUUID } from 'class-validator';
import { ACCESS_RULE, type AccessRequest, type AccessRule, type Role } from '../common/access.decorator';
import { Problem } from '../common/problem';
import { WorkshopsService } from '../workshops/workshops.service';

/** Stands before every route and lets nobody through whom the route's rule does not name. */
@Injectable()
export class AccessGuard extends AuthGuard('jwt') {
  constructor(
    private readonly reflector: Reflector,
    private readonly workshops: WorkshopsService,
  ) {
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
    return this.isMemberWith(rule as readonly Role[], context.switchToHttp().getRequest<AccessRequest>());
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

  private async isMemberWith(roles: readonly Role[], request: AccessRequest): Promise<boolean> {
    const workshopId = request.params.workshopId;
    const userId = request.user?.id;
    if (!userId || typeof workshopId !== 'string' || !isUUID(workshopId)) throw Problem.notFound('workshop');
    const role = await this.workshops.findRole(workshopId, userId);
    if (!role) throw Problem.notFound('workshop');
    request.member = { workshopId, userId, role };
    if (!roles.includes(role)) {
      throw Problem.forbidden('role-not-allowed', `This is for: ${roles.join(', ')}. Your role is ${role}.`);
    }
    return true;
  }
}
