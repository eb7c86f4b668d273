import { DEMO_PEOPLE, DEMO_SCOPES } from '../../../server/db/demo-people';
import { RIGHTS } from '../../../server/db/entities/scope-right';
import { inTransaction } from '../../../server/db/in-transaction';
import { seed } from '../../../server/db/seed';
import { ACTS, allows } from '../../../server/features/rights/policy';
import { findRight } from '../../../server/features/rights/repository';
import { openTestDatabase, type TestDatabase } from '../../support/open-test-schema';

let database: TestDatabase;
beforeAll(async () => {
  database = await openTestDatabase();
  await seed(database.owner);
});
afterAll(() => database?.close());

it('allows what the table of rights says, and nothing without a right', () => {
  const table = [null, ...RIGHTS].map((right) => ({
    right,
    acts: ACTS.filter((act) => allows(right, act)).join(' '),
  }));
  expect(table).toEqual([
    { right: null, acts: '' },
    { right: 'read', acts: 'read' },
    { right: 'write', acts: 'read write' },
    { right: 'own', acts: 'read write share delete' },
  ]);
});

it('finds the right of each person in each scope, as the rows say', async () => {
  for (const scope of DEMO_SCOPES) {
    for (const person of DEMO_PEOPLE) {
      const found = await inTransaction(database.db, person.id, (manager) =>
        findRight(manager, person.id, scope.id),
      );
      const share = scope.shared.find((one) => one.with.id === person.id);
      expect(found).toBe(scope.owner.id === person.id ? 'own' : (share?.right ?? null));
    }
  }
});
