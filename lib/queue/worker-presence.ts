import pg from 'pg';

/**
 * How living workers are told from dead ones.
 *
 * A worker locks the jobs it runs under a name of its own. For as long as it lives it also holds, in one database
 * session, an advisory lock made from that name. The database drops the lock when the session ends, however it ends: so
 * whoever can take the lock of a name knows that the worker of that name is gone, and its jobs can be given to others.
 */

/** First half of the advisory lock's key, so that no other use of such locks meets ours: "hm" in ASCII. */
const lockSpace = 0x686d;

/** A name must be seen without its worker this long before its jobs are freed: time for a worker that lost its session to take it again. */
const patienceMs = 10_000;

/** Jobs locked more recently than this are left alone: their worker may be about to take its lock. */
const freshSeconds = 5;

/** The session in which a worker process shows that it lives. */
export type Presence = {
  /** Takes the lock of a name; call it before any job is locked under that name. */
  announce(name: string): Promise<void>;
  /** Frees the jobs of workers that are gone; returns the names of those workers. */
  freeJobsOfTheDead(): Promise<string[]>;
  close(): Promise<void>;
};

/**
 * Opens the session.
 *
 * @param onLost called once if the session ends before `close`; the process should then end, since others will take
 *   its jobs
 */
export async function openPresence(databaseUrl: string, onLost: (error: Error) => void): Promise<Presence> {
  const client = new pg.Client({
    connectionString: databaseUrl,
    application_name: 'halfmark worker presence',
    keepAlive: true,
    // A machine that vanished from the network is noticed within half a minute, not after the system's two hours.
    options: '-c tcp_keepalives_idle=15 -c tcp_keepalives_interval=5 -c tcp_keepalives_count=3',
    connectionTimeoutMillis: 10_000,
    query_timeout: 20_000,
  });
  let closing = false;
  let lost = false;
  const lose = (error: Error) => {
    if (closing || lost) return;
    lost = true;
    onLost(error);
  };
  client.on('error', lose);
  client.on('end', () => lose(new Error('The database ended the session of this worker.')));
  await client.connect();

  const missingSince = new Map<string, number>();
  return {
    async announce(name) {
      await client.query('select pg_advisory_lock($1, hashtext($2))', [lockSpace, name]);
    },
    async freeJobsOfTheDead() {
      const names = await namesWithoutWorker(client);
      const now = performance.now();
      for (const name of missingSince.keys()) if (!names.includes(name)) missingSince.delete(name);
      for (const name of names) if (!missingSince.has(name)) missingSince.set(name, now);
      const dead = names.filter((name) => now - (missingSince.get(name) ?? now) >= patienceMs);
      if (dead.length === 0) return [];
      await client.query('select graphile_worker.force_unlock_workers($1::text[])', [dead]);
      for (const name of dead) missingSince.delete(name);
      return dead;
    },
    async close() {
      closing = true;
      await client.end();
    },
  };
}

/** The names under which jobs or job queues are locked though nobody holds the lock of the name. */
async function namesWithoutWorker(client: pg.Client): Promise<string[]> {
  const { rows } = await client.query<{ name: string }>(
    `select locked_by as name
       from (
         select locked_by, locked_at from graphile_worker._private_jobs where locked_by is not null
         union all
         select locked_by, locked_at from graphile_worker._private_job_queues where locked_by is not null
       ) as held
      where not exists (
        select from pg_locks
         where locktype = 'advisory' and granted and objsubid = 2
           and database = (select oid from pg_database where datname = current_database())
           and classid = $1::integer::oid and objid = hashtext(locked_by)::bit(32)::bigint::oid
      )
      group by locked_by
     having max(locked_at) < now() - make_interval(secs => $2)`,
    [lockSpace, freshSeconds],
  );
  return rows.map(({ name }) => name);
}
