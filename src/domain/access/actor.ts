import type { Role } from './roles';

/** Who acts, in which workshop: read from the session, never from what a client sends. */
export interface Actor {
  userId: string;
  workshopId: string;
  workshopName: string;
  role: Role;
  name: string;
  email: string;
}
