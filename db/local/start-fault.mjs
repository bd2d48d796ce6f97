/**
 * Something that stops a command and that a person can mend: one sentence that says what is wrong
 * and one that says what to do next. Commands print both and leave with a non-zero code.
 */
export class StartFault extends Error {
  /**
   * @param {string} sentence what is wrong
   * @param {string} nextStep what to do about it
   */
  constructor(sentence, nextStep) {
    super(sentence);
    this.name = 'StartFault';
    this.nextStep = nextStep;
  }
}
