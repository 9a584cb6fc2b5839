import { inTransaction, system, type Caller, type Database } from '@seamwright/shared/server';
import { newId } from '@seamwright/shared/util';

export interface TestPeople {
  readonly author: Caller;
  readonly approver: Caller;
}

/** Two technical people: one writes, the other approves. */
export async function addTestPeople(database: Database, now: Date): Promise<TestPeople> {
  const [author, approver] = [newId(), newId()];
  await inTransaction(database, system('seed'), (tx) =>
    tx
      .insertInto('people')
      .values(
        [author, approver].map((id, at) => ({
          id,
          email: `${id}@example.test`,
          name: at === 0 ? 'Ada Author' : 'Ben Reviewer',
          roles: ['technical'],
          createdAt: now,
        })),
      )
      .execute(),
  );
  const technical = (personId: string): Caller => ({ kind: 'staff', personId, roles: ['technical'], customers: '*' });
  return { author: technical(author), approver: technical(approver) };
}
