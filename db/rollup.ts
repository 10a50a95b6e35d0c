import { QueryTypes, type Sequelize } from 'sequelize';

const WORK = 'usage_hourly';
/** An hour counts as complete when it ended this long ago: its last rows are in by then. */
const SETTLE = '5 minutes';
/** Hours rolled up again each time, for rows that came later still. */
const HOURS_AGAIN = 3;

/**
 * Gathers completed hours of `usage_events` into `usage_hourly`, as the owner. Doing it again
 * gives the same rows: each hour is written anew, whole.
 *
 * @returns how many hours were rolled up.
 */
export async function rollUpHours(owner: Sequelize): Promise<number> {
  return owner.transaction(async (transaction) => {
    const [span] = await owner.query<{ from: Date | null; to: Date }>(
      `select date_trunc('hour', now() - interval '${SETTLE}', 'UTC') as to,
              coalesce((select reached - interval '${HOURS_AGAIN} hours'
                          from work_marks where work = '${WORK}'),
                       (select date_trunc('hour', min(at), 'UTC') from usage_events)) as from`,
      { type: QueryTypes.SELECT, transaction },
    );
    if (!span?.from || span.from >= span.to) return 0;
    const bind = [span.from, span.to];
    await owner.query('delete from usage_hourly where hour >= $1 and hour < $2', {
      bind,
      transaction,
    });
    // A streamed answer is counted at its end row, which holds its status and duration.
    await owner.query(
      `insert into usage_hourly
              (hour, client_id, route, http_status, answer, calls, duration_us_sum)
       select date_trunc('hour', at, 'UTC'), client_id, route, http_status, answer,
              sum(repeats), coalesce(sum(duration_us::bigint * repeats), 0)
         from usage_events
        where at >= $1 and at < $2 and phase <> 'start'
        group by 1, 2, 3, 4, 5`,
      { bind, transaction },
    );
    await owner.query(
      `insert into work_marks (work, reached) values ('${WORK}', $1)
       on conflict (work) do update set reached = excluded.reached`,
      { bind: [span.to], transaction },
    );
    return Math.round((span.to.getTime() - span.from.getTime()) / 3_600_000);
  });
}
