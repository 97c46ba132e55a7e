import { Injectable, type OnModuleInit, type Type } from '@nestjs/common';
import { PATH_METADATA } from '@nestjs/common/constants';
import { DiscoveryService, MetadataScanner, Reflector } from '@nestjs/core';
import { ACCESS_RULE, type AccessRule, ROLES } from '../common/access.decorator';

type Method = (...values: unknown[]) => unknown;

/** The application does not start while a route has no rule, or roles without a workshop to have them in. */
@Injectable()
export class AccessRulesCheck implements OnModuleInit {
  constructor(
    private readonly discovery: DiscoveryService,
    private readonly scanner: MetadataScanner,
    private readonly reflector: Reflector,
  ) {}

  onModuleInit(): void {
    const faults = this.discovery.getControllers().flatMap(({ metatype, instance }) => {
      if (!metatype || !instance) return [];
      const prototype = Object.getPrototypeOf(instance) as Record<string, Method>;
      return this.scanner
        .getAllMethodNames(prototype)
        .flatMap((name) => this.faultOf(metatype as Type, name, prototype[name]) ?? []);
    });
    if (faults.length > 0) throw new Error(`Routes without a usable access rule:\n  ${faults.join('\n  ')}`);
  }

  private faultOf(controller: Type, name: string, method?: Method): string | null {
    const path = method && this.pathOf(method);
    if (!method || path === undefined) return null;
    const rule = this.reflector.getAllAndOverride<AccessRule | undefined>(ACCESS_RULE, [method, controller]);
    const route = `${controller.name}.${name}`;
    if (!rule) return `${route}: none declared`;
    const full = `${this.pathOf(controller) ?? ''}/${path}`;
    const hasRoles = ROLES.some((role) => (rule as readonly string[]).includes(role));
    if (hasRoles !== full.includes(':workshopId')) {
      return `${route}: roles and :workshopId in the path go together; rule ${rule.join(', ')}, path ${full}`;
    }
    return null;
  }

  private pathOf(target: object): string | undefined {
    const path = Reflect.getMetadata(PATH_METADATA, target) as string | string[] | undefined;
    return Array.isArray(path) ? path.join(' ') : path;
  }
}
