import type { DataSource } from 'typeorm';
import type { Role } from '../common/access.decorator';
import { type PreparedStatement, runPrepared } from '../database/prepared-statement';

const FIND_CALLER: PreparedStatement = {
  name: 'find-caller',
  text: `
    SELECT membership.role
    FROM sessions session
    LEFT JOIN memberships membership
      ON membership.user_id = session.user_id AND membership.workshop_id = $3
    WHERE session.id = $1 AND session.user_id = $2 AND session.ended_at IS NULL AND session.expires_at > now()`,
};

/**
 * Whether the session is open, and what the person is in the workshop, in one question: it is asked before every
 * request of a signed-in person.
 *
 * @returns null when the session is not open; `role` is null to those who are no members, and without a workshop
 */
export async function findCaller(
  dataSource: DataSource,
  sessionId: string,
  userId: string,
  workshopId: string | null,
): Promise<{ role: Role | null } | null> {
  const [caller] = await runPrepared<{ role: Role | null }>(dataSource, FIND_CALLER, [
    sessionId,
    userId,
    workshopId,
  ]);
  return caller ?? null;
}
