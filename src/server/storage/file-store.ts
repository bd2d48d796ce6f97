/** Where files are kept that are too large for the database. A key says what is in it, so it never changes. */
export interface FileStore {
  /** Keeps the bytes whole or not at all; a key that is there already is left as it is. */
  put(key: string, bytes: Uint8Array): Promise<void>;
  /** A file of this machine that has the bytes of this key; null when nothing was put there. */
  fileOf(key: string): Promise<string | null>;
  /**
   * Runs `work` with a file that holds what is sent, and removes it whatever happens. Refuses (`too-large`) more
   * than `mostBytes`.
   */
  withIncoming<T>(
    sent: AsyncIterable<Uint8Array>,
    mostBytes: number,
    work: (file: string) => Promise<T>,
  ): Promise<T>;
}
