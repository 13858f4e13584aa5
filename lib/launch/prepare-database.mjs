// @ts-check
import pg from 'pg';

/**
 * Sees to the two roles and the database: the owner runs migrations, the application's role owns nothing and cannot
 * pass row-level security by.
 * @param {string} superuserUrl
 * @param {{ ownerPassword: string, appPassword: string }} passwords
 * @param {string} name - of the database
 */
export async function prepareDatabase(superuserUrl, { ownerPassword, appPassword }, name = 'spinstead') {
  const client = new pg.Client({ connectionString: superuserUrl });
  await client.connect();
  try {
    for (const [role, password] of [
      ['spinstead_owner', ownerPassword],
      ['spinstead_app', appPassword],
    ]) {
      const { rowCount } = await client.query('select 1 from pg_roles where rolname = $1', [role]);
      const options = 'login nosuperuser nobypassrls nocreatedb nocreaterole';
      const literal = client.escapeLiteral(password ?? '');
      await client.query(`${rowCount ? 'alter' : 'create'} role ${role} ${options} password ${literal}`);
    }
    const { rowCount } = await client.query('select 1 from pg_database where datname = $1', [name]);
    if (!rowCount) await client.query(`create database ${name} owner spinstead_owner`);
  } finally {
    await client.end();
  }
  const url = (/** @type {string} */ role, /** @type {string} */ password) => {
    const wanted = new URL(superuserUrl);
    wanted.username = role;
    wanted.password = password;
    wanted.pathname = name;
    return wanted.href;
  };
  return { ownerUrl: url('spinstead_owner', ownerPassword), appUrl: url('spinstead_app', appPassword) };
}
