/** With many rows no page and no worker reads a whole table: what PostgreSQL's planner says of the queries themselves. */
import { randomUUID } from 'node:crypto';
import { drizzle } from 'drizzle-orm/node-postgres';
import { Pool } from 'pg';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { type Db, openDatabase } from '@/db/client';
import { auditPage } from '@/db/queries/audit';
import { changeOf, changesPage } from '@/db/queries/changes';
import { claimJob, jobsPage, openItems } from '@/db/queries/jobs';
import { keyOfHash, keysOf } from '@/db/queries/keys';
import { resultsOf } from '@/db/queries/results';
import { signInsOf } from '@/db/queries/sessions';
import { positionsOf } from '@/db/queries/studies';
import { countedStudy, studiesPage } from '@/db/queries/study-list';
import { countPositions, lastOrder } from '@/db/queries/study-positions';
import { userByEmailKey } from '@/db/queries/users';
import { roleIn, workspacesOfUser } from '@/db/queries/workspaces';
import * as schema from '@/db/schema';
import { type Postgres, startPostgres } from '@/tests/support/postgres';
import { MIGRATIONS } from '@/tests/support/world';

/** 200 workspaces of one member each, with 20,000 rows of everything that grows. */
const FILL = `
  insert into workspaces (name, slug) select 'w' || n, 'w' || n from generate_series(1, 200) n;
  insert into users (email, email_key) select 'u' || n, 'u' || n from generate_series(1, 20000) n;
  create temp table ws as select id, row_number() over () as n from workspaces;
  create temp table us as select id, row_number() over () as n from users;
  insert into memberships (workspace_id, user_id, role) select ws.id, us.id, 'coach' from us join ws on ws.n = 1 + us.n % 200;
  insert into sign_ins (user_id, created_at) select us.id, now() - n * interval '1 minute' from us;
  insert into studies (workspace_id, title, updated_at)
    select ws.id, 's', now() - g * interval '1 minute' from ws, generate_series(1, 100) g;
  create temp table st as select id, workspace_id, row_number() over () as n from studies;
  insert into positions (study_id, "order", fen, position_key) select id, g, 'f', 'k' || n from st, generate_series(1, 2) g;
  insert into results (study_id, kind, request, result, engine_version) select id, 'route', '{}', '{}', '1' from st;
  insert into changes (workspace_id, study_id, entity, entity_id, version, kind, at)
    select workspace_id, id, 'study', id, g, 'update', now() - g * interval '1 minute' from st, generate_series(1, 3) g;
  insert into audit_log (workspace_id, action, at)
    select ws.id, 'x', now() - g * interval '1 minute' from ws, generate_series(1, 100) g;
  insert into api_keys (workspace_id, name, prefix, hash, scopes)
    select ws.id, 'k', 'p', md5(ws.n || '-' || g), '{}' from ws, generate_series(1, 100) g;
  insert into jobs (workspace_id, kind, state, input, created_at)
    select ws.id, 'readings', case when g = 1 and ws.n < 5 then 'queued' else 'done' end, '{}', now() - g * interval '1 minute'
    from ws, generate_series(1, 100) g;
  insert into job_items (job_id, number, state)
    select id, g, case when g = 20 then 'queued' else 'done' end from (select id from jobs limit 1000) j, generate_series(1, 20) g;
  analyze;
`;

const at = new Date();
const page = { workspaceId: randomUUID(), limit: 20 } as const;
const after = { at, id: randomUUID() };
const id = randomUUID();

/** What is asked, and whether it is a page in order: then nothing may be sorted that an index has in order already. */
const ASKED: readonly (readonly [
  string,
  'page' | 'row' | 'list',
  (db: Db, workspaceId: string) => Promise<unknown>,
])[] = [
  ['the list of studies', 'page', (db, workspaceId) => studiesPage(db, { ...page, workspaceId, trash: false })],
  ['its second page', 'page', (db, workspaceId) => studiesPage(db, { ...page, workspaceId, trash: false, after })],
  ['the trash', 'list', (db, workspaceId) => studiesPage(db, { ...page, workspaceId, trash: true })],
  ['a study', 'row', (db, workspaceId) => countedStudy(db, workspaceId, id)],
  ['its positions', 'list', (db) => positionsOf(db, id)],
  ['how many they are', 'row', (db) => countPositions(db, id)],
  ['the last place', 'row', (db) => lastOrder(db, id)],
  ['its results', 'page', (db) => resultsOf(db, id, 'route')],
  ['its history', 'page', (db) => changesPage(db, { studyId: id, limit: 20 })],
  ['a version', 'row', (db) => changeOf(db, id, 2)],
  ['the audit page', 'page', (db, workspaceId) => auditPage(db, { ...page, workspaceId })],
  ['the jobs page', 'page', (db, workspaceId) => jobsPage(db, { ...page, workspaceId })],
  ['the next job', 'row', (db) => claimJob(db, { worker: 'w', at, staleBefore: new Date(0) })],
  ['its next items', 'page', (db) => openItems(db, id, 20)],
  ['a workspace’s keys', 'list', (db, workspaceId) => keysOf(db, workspaceId)],
  ['a key', 'row', (db) => keyOfHash(db, 'h')],
  ['a person by address', 'row', (db) => userByEmailKey(db, 'u7')],
  ['a person’s sessions', 'list', (db) => signInsOf(db, id)],
  ['a role', 'row', (db, workspaceId) => roleIn(db, workspaceId, id)],
  ['a person’s workspaces', 'list', (db) => workspacesOfUser(db, id)],
];

describe('the plan of', () => {
  let postgres: Postgres | undefined;
  let pool: Pool | undefined;
  let workspaceId = '';
  const asked: { readonly query: string; readonly params: unknown[] }[] = [];
  beforeAll(async () => {
    postgres = await startPostgres();
    const url = await postgres.newDatabase();
    const database = await openDatabase({ url });
    await database.migrate(MIGRATIONS);
    await database.close();
    pool = new Pool({ connectionString: url, max: 2 });
    await pool.query(FILL);
    workspaceId = (await pool.query<{ id: string }>('select id from workspaces limit 1')).rows[0]?.id ?? '';
  }, 120_000);
  afterAll(async () => {
    await pool?.end();
    await postgres?.stop();
  }, 60_000);

  it.each(ASKED)('%s reads by an index', { timeout: 30_000 }, async (_, kind, ask) => {
    if (pool === undefined) throw new Error('the server has not been started');
    const logQuery = (query: string, params: unknown[]) => asked.push({ query, params });
    asked.length = 0;
    await ask(drizzle(pool, { schema, logger: { logQuery } }), workspaceId);
    const selects = asked.filter(({ query }) => query.startsWith('select'));
    expect(selects.length).toBeGreaterThan(0);
    for (const { query, params } of selects) {
      const { rows } = await pool.query<{ 'QUERY PLAN': string }>(`explain ${query}`, params);
      const plan = rows.map((row) => row['QUERY PLAN']).join('\n');
      // 200 workspaces fit on a page or two: reading them all is right.
      expect(plan.replaceAll('Seq Scan on workspaces', '')).not.toContain('Seq Scan');
      if (kind === 'page') expect(plan).not.toContain('Sort');
    }
  });
});
