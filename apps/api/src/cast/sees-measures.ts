import type { MemberInfo } from '../common/access.decorator';

/** Bodies are personal: only who designs for them sees the numbers. */
export function seesMeasures({ role }: MemberInfo): boolean {
  return role === 'owner' || role === 'designer';
}
