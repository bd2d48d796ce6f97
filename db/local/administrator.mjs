import { userInfo } from 'node:os';

/**
 * The database account with all rights: the one named like the system account that made the data
 * folder, which the socket lets in without a password.
 */
export function administrator() {
  return userInfo().username;
}
