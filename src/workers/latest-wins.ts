/**
 * Does one job at a time; of those that arrive meanwhile only the newest is kept. Before each job the event
 * loop gets a turn, so that everything already waiting in it is seen first.
 */
export function latestWins<T>(job: (input: T) => Promise<void>): (input: T) => void {
  let waiting: { input: T } | null = null;
  let running = false;

  async function run(): Promise<void> {
    running = true;
    while (waiting) {
      await new Promise((resolve) => setTimeout(resolve, 0));
      const { input }: { input: T } = waiting;
      waiting = null;
      await job(input);
    }
    running = false;
  }

  return (input) => {
    waiting = { input };
    if (!running) void run();
  };
}
