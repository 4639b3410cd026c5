import { mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import pg from 'pg';
import type { TestProject } from 'vitest/node';
import { prepareDatabase } from '#api/launch/database.js';
import { removeCluster, startCluster } from '#db/cluster/cluster.js';

declare module 'vitest' {
  export interface ProvidedContext {
    /** Pattern of a database's URL on the throwaway cluster, with NAME for the database. */
    databaseUrlPattern: string;
  }
}

const templateName = 'migrated_template';

/** A throwaway cluster with one migrated database, from which every test file clones its own. */
export default async function setUp(project: TestProject) {
  const parent = mkdtempSync(join(tmpdir(), 'dropwatt-test-'));
  const folder = join(parent, 'postgres');
  const cluster = await startCluster({ folder, throwaway: true });
  await prepareDatabase(cluster, templateName);
  const client = new pg.Client({ connectionString: cluster.url('postgres') });
  await client.connect();
  await client.query(`alter database ${templateName} with allow_connections false is_template true`);
  await client.end();
  project.provide('databaseUrlPattern', cluster.url('NAME'));
  return () => {
    cluster.stop();
    removeCluster(folder);
    rmSync(parent, { recursive: true, force: true });
  };
}
