import { QueryTypes, type Sequelize } from 'sequelize';

/** Forgets windows that no policy can still be counting, as the owner. */
export async function forgetRateCounts(owner: Sequelize): Promise<number> {
  const [row] = await owner.query<{ count: number }>(
    `with gone as (
       delete from rate_counts where window_start < now() - interval '1 day' returning 1)
     select count(*)::int as count from gone`,
    { type: QueryTypes.SELECT },
  );
  return row?.count ?? 0;
}
