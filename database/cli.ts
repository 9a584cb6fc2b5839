import { spawnSync } from 'node:child_process';
import { migrateToHead } from './migrate';
import { adminSql, dropDatabase, ensureDatabase, ensureRoles, roleUrls } from './roles';

const USAGE =
  'usage: tsx database/cli.ts prepare | migrate | types | drop | admin-sql   (DATABASE_URL, SEAMWRIGHT_DATABASE)';

async function main(command: string | undefined): Promise<void> {
  const database = process.env['SEAMWRIGHT_DATABASE'] ?? 'seamwright';
  const adminUrl = process.env['DATABASE_URL'];
  if (!adminUrl) throw new Error('DATABASE_URL must hold the address of an administrator of the PostgreSQL server.');
  switch (command) {
    case 'prepare':
    case 'migrate': {
      await ensureRoles(adminUrl);
      await ensureDatabase(adminUrl, database);
      const urls = roleUrls(adminUrl, database);
      const made = await migrateToHead(urls.ownerUrl);
      if (command === 'migrate') console.log(made.length ? `Applied ${made.join(', ')}` : 'Already at head');
      else console.log(JSON.stringify(urls));
      return;
    }
    case 'types': {
      const { ownerUrl } = roleUrls(adminUrl, database);
      const run = spawnSync('node_modules/.bin/kysely-codegen', typesArguments(ownerUrl), { stdio: 'inherit' });
      if (run.status !== 0) throw new Error('kysely-codegen failed');
      return;
    }
    case 'admin-sql':
      return void console.log(adminSql(adminUrl, database));
    case 'drop':
      return dropDatabase(adminUrl, database);
    default:
      throw new Error(USAGE);
  }
}

/** How the types are generated: whole numbers for bigint (the pool's own parsers read them so), dates as strings. */
export function typesArguments(url: string, outFile = 'database/schema.ts'): string[] {
  return [
    `--url=${url}`,
    '--dialect=postgres',
    `--out-file=${outFile}`,
    '--camel-case',
    '--exclude-pattern=schema_migrations',
    '--numeric-parser=string',
    '--type-mapping={"int8":"number","jsonb":"unknown","daterange":"string"}',
    '--date-parser=string',
    '--log-level=warn',
  ];
}

if (require.main === module || process.argv[1]?.endsWith('database/cli.ts')) {
  main(process.argv[2]).catch((error: Error) => {
    console.error(error.message);
    process.exitCode = 1;
  });
}
