import type { Approval } from '../api.ts';

export function sayApproval(approval: Approval | undefined): string {
  if (!approval) return 'not signed yet';
  const word = approval.decision === 'approved' ? 'approved' : 'changes wanted';
  return `${word} by ${approval.decidedBy.name}`;
}
