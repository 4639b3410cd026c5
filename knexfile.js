/** One configuration for migrations and seeds, read from DATABASE_URL. */
export default {
  client: 'pg',
  connection: process.env.DATABASE_URL,
  migrations: { directory: './db/migrations', loadExtensions: ['.js'], stub: './db/migration.stub.js' },
};
