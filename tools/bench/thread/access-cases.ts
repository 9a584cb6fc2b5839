import { createHash, randomBytes } from 'node:crypto';
import { verify } from 'argon2';
import { signIn } from '@seamwright/identity/contracts';
import { newId } from '@seamwright/shared/util';
import type { BenchCase } from '../bench';
import { credentialsOf, known, type Stage } from './stage';

const WHO = 'lucian';
const DAY_MS = 86_400_000;

/** Signing in: the floor checks the same hash and writes the same session. */
export function accessCases({ api, plain }: Stage): BenchCase[] {
  const credentials = credentialsOf(WHO);
  const floor = () =>
    plain.inTransaction(async () => {
      const failed = await plain.query(
        `insert into sign_in_failures (email_hash, source_hash, failed_at) values ('bench', 'bench', now()) returning id`,
      );
      const [person] = await plain.query(
        `select p.*, c.name as customer_name, c.active as customer_active,
           array(select site_id from person_sites ps where ps.person_id = p.id) as site_ids,
           array(select customer_id from staff_customers sc where sc.person_id = p.id) as customer_ids
         from people p left join customers c on c.id = p.customer_id where lower(p.email) = $1`,
        [credentials.email],
      );
      const hash = known(person?.['password_hash'], `password of ${WHO}`) as string;
      if (!(await verify(hash, credentials.password))) throw new Error('The password is not right');
      await plain.query('delete from sign_in_failures where id = $1', [failed[0]?.['id']]);
      const session = newId();
      const now = new Date();
      await plain.query(
        `insert into sign_in_sessions (id, person_id, application, device, created_at, last_used_at, expires_at)
         values ($1, $2, 'storefront', 'bench', $3, $3, $4)`,
        [session, person?.['id'], now, new Date(now.getTime() + DAY_MS)],
      );
      const token = createHash('sha256').update(randomBytes(32)).digest('hex');
      await plain.query(
        'insert into refresh_tokens (token_hash, session_id, generation, issued_at) values ($1, $2, 1, $3)',
        [token, session, now],
      );
    });
  return [
    {
      name: signIn.id,
      size: 'argon2id, 19 MiB',
      target: 1.2,
      ours: () => api.call(null, signIn, { body: credentials }),
      floor,
    },
  ];
}
