import type { Approval } from '../api.ts';

export function sayWhen(iso: string): string {
  return new Date(iso).toLocaleString(undefined, {
    day: 'numeric',
    month: 'long',
    year: 'numeric',
    hour: 'numeric',
    minute: '2-digit',
  });
}

export function sayApproval(approval: Approval | undefined): string {
  if (!approval) return 'not signed yet';
  const word = approval.decision === 'approved' ? 'approved' : 'changes wanted';
  return `${word} by ${approval.decidedBy.name}`;
}
