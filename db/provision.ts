import { Client } from 'pg';

/** Roles belong to the whole cluster; migrations name them in their grants. */
const ROLES = {
  /** Owns the database and runs migrations; policies do not bind it. */
  owner: { role: 'ringtrue_owner', attributes: 'bypassrls' },
  /** Serves requests; policies always bind it. */
  app: { role: 'ringtrue_app', attributes: 'nobypassrls' },
  /** Dumps the database, and may only read. */
  backup: { role: 'ringtrue_backup', attributes: 'bypassrls' },
} as const;

type RoleName = keyof typeof ROLES;
const ROLE_NAMES: readonly RoleName[] = ['owner', 'app', 'backup'];

export type Passwords = Readonly<Record<RoleName, string>>;
export type DatabaseUrls = Readonly<Record<RoleName, string>>;

/** Creates the three roles where they are missing, and sets their passwords and attributes. */
async function createRoles(client: Client, passwords: Passwords): Promise<void> {
  await client.query("set password_encryption = 'scram-sha-256'");
  const { rows } = await client.query<{ rolname: string }>('select rolname from pg_roles');
  const existing = new Set(rows.map((row) => row.rolname));
  for (const name of ROLE_NAMES) {
    const { role, attributes } = ROLES[name];
    const verb = existing.has(role) ? 'alter' : 'create';
    await client.query(
      `${verb} role ${role} login nosuperuser nocreatedb nocreaterole noreplication ${attributes}
       password ${client.escapeLiteral(passwords[name])}`,
    );
  }
  await client.query(`alter role ${ROLES.backup.role} set default_transaction_read_only = on`);
}

/** Lets in only the three roles. */
async function closeToOthers(client: Client, database: string): Promise<void> {
  const name = client.escapeIdentifier(database);
  await client.query(`revoke all on database ${name} from public`);
  await client.query(
    `grant connect on database ${name} to ${ROLES.app.role}, ${ROLES.backup.role}`,
  );
}

/**
 * Creates the roles and an empty database of the owner's; both may exist already.
 *
 * @param adminUrl - a superuser's address in the cluster, with any database
 * @returns the address of the database for each role
 */
export async function provision(
  adminUrl: string,
  database: string,
  passwords: Passwords,
): Promise<DatabaseUrls> {
  const client = new Client({ connectionString: adminUrl });
  await client.connect();
  try {
    await createRoles(client, passwords);
    await createDatabase(client, database);
  } finally {
    await client.end();
  }
  return urlsFor(adminUrl, database, passwords);
}

async function createDatabase(client: Client, database: string): Promise<void> {
  const { rowCount } = await client.query('select 1 from pg_database where datname = $1', [
    database,
  ]);
  if (!rowCount) {
    const name = client.escapeIdentifier(database);
    await client.query(`create database ${name} owner ${ROLES.owner.role} template template0`);
  }
  await closeToOthers(client, database);
}

/** The address of a database in the admin's cluster, for each of the three roles. */
function urlsFor(adminUrl: string, database: string, passwords: Passwords): DatabaseUrls {
  const urlOf = (name: RoleName) => {
    const url = new URL(adminUrl);
    url.username = ROLES[name].role;
    url.password = encodeURIComponent(passwords[name]);
    url.pathname = `/${encodeURIComponent(database)}`;
    return url.toString();
  };
  return { owner: urlOf('owner'), app: urlOf('app'), backup: urlOf('backup') };
}
