import type { SignUp } from '~/domain/access/account';
import type { Context } from '../context';
import { newId } from '../database/new-id';
import { insertMembership } from '../database/repositories/memberships';
import { insertUser } from '../database/repositories/users';
import { insertWorkshop } from '../database/repositories/workshops';
import { inTransaction } from '../database/transaction';
import { hashPassword } from '../auth/passwords';

/** Opens a workshop; whoever opens it is its manager, and signed in. Anybody may. */
export async function signUp(
  context: Context,
  _actor: null,
  input: SignUp,
): Promise<{ workshopId: string; userId: string; setCookie: string }> {
  const workshopId = newId();
  const userId = newId();
  const createdAt = context.clock.now();
  // hashed also for an address that is taken: the answer then comes as late as any other
  const passwordHash = await hashPassword(input.password);
  await inTransaction(context.database, async (transaction) => {
    const { database } = context;
    await insertWorkshop(
      database,
      { id: workshopId, name: input.workshopName, createdAt },
      transaction,
    );
    await insertUser(
      database,
      { id: userId, name: input.name, email: input.email, passwordHash, createdAt },
      transaction,
    );
    await insertMembership(
      database,
      { workshopId, userId, role: 'manager', createdAt },
      transaction,
    );
  });
  return { workshopId, userId, setCookie: await context.sessions.begin({ userId, workshopId }) };
}
