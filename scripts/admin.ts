import postgres from 'postgres';

/**
 * `npm run admin -- grant <e-mail>` or `revoke <e-mail>`: gives or takes the flag that shows the pages of whoever runs the site.
 * The last admin keeps it. Reads DATABASE_URL.
 */
async function main([verb, email]: string[]): Promise<string> {
  const url = process.env.DATABASE_URL;
  if (!url) return 'DATABASE_URL is not set.';
  if ((verb !== 'grant' && verb !== 'revoke') || !email)
    return 'Say `grant` or `revoke`, then the e-mail address of an account.';
  const sql = postgres(url, { max: 1, onnotice: () => {} });
  const isAdmin = verb === 'grant';
  try {
    return await sql.begin(async (tx) => {
      await tx`select pg_advisory_xact_lock(hashtext('ruckle admins'))`;
      const [row] = await tx<{ id: string }[]>`
        update users set is_admin = ${isAdmin}, version = version + 1
        where email = ${email.toLowerCase()} and deleted_at is null and email_verified_at is not null
          and (${isAdmin} or exists (select 1 from users o where o.is_admin and o.email <> ${email.toLowerCase()} and o.deleted_at is null and o.suspended_at is null))
        returning id`;
      if (!row) return 'Nothing was changed: no confirmed account has that address, or it is the last admin.';
      await tx`insert into audit (verb, object_kind, object_id, fields) values ('update', 'user', ${row.id}, ${['isAdmin']})`;
      return isAdmin ? 'Is an admin now.' : 'Is no admin any more.';
    });
  } finally {
    await sql.end();
  }
}

console.log(await main(process.argv.slice(2)));
