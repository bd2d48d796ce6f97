const most = 2;
let running = 0;
const waiting: (() => void)[] = [];

/** Runs at most two of these at once, the rest in order: hashing takes 19 MiB and a core each. */
export async function oneOfTwo<T>(work: () => Promise<T>): Promise<T> {
  if (running >= most) await new Promise<void>((resolve) => waiting.push(resolve));
  else running += 1;
  try {
    return await work();
  } finally {
    const next = waiting.shift();
    if (next === undefined) running -= 1;
    else next();
  }
}
