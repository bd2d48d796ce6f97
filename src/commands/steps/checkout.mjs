import { fileURLToPath } from 'node:url';

/** Absolute path of this checkout, without a slash at its end. */
export const checkout = fileURLToPath(new URL('../../../', import.meta.url)).replace(/\/$/, '');
