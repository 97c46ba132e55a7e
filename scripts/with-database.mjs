// node scripts/with-database.mjs <main|test> -- <command…>: runs a command with DATABASE_URL of a private PostgreSQL.
import { startPostgres } from './postgres.mjs';
import { runToEnd } from './processes.mjs';

const [name = 'test', , ...command] = process.argv.slice(2);
if (command.length === 0) {
  console.error('Usage: node scripts/with-database.mjs <main|test> -- <command…>');
  process.exit(2);
}
const database = await startPostgres(name);
const code = await runToEnd(command, { env: { ...process.env, DATABASE_URL: database.url } });
await database.stop();
process.exit(code);
