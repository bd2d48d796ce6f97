/**
 * A mesh file that cannot be taken: the message is one sentence for the person who chose it, with the line,
 * triangle or place at fault. `sentences` has one a fault where there are several.
 */
export class MeshFileError extends Error {
  readonly sentences: readonly string[];

  constructor(...sentences: readonly [string, ...string[]]) {
    super(sentences.join(' '));
    this.name = 'MeshFileError';
    this.sentences = sentences;
  }
}
