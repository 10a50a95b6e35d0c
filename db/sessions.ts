import { QueryTypes, type Sequelize } from 'sequelize';

/** Removes sessions that have ended by themselves, as the owner. */
export async function forgetSessions(owner: Sequelize): Promise<number> {
  const [row] = await owner.query<{ count: number }>(
    `with gone as (delete from sessions where expire < now() returning 1)
     select count(*)::int as count from gone`,
    { type: QueryTypes.SELECT },
  );
  return row?.count ?? 0;
}
