import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { newHistory, record, redo, undo } from '~/scene/history';

describe('history', () => {
  it('gives back each state in turn, and forward again', () => {
    let history = newHistory(0);
    history = record(history, 1, 'one');
    history = record(history, 2, 'two');
    expect(undo(history).present).toBe(1);
    expect(undo(undo(history)).present).toBe(0);
    expect(undo(undo(undo(history))).present).toBe(0);
    expect(redo(undo(history)).present).toBe(2);
  });

  it('forgets the future once something else is done', () => {
    let history = record(newHistory('a'), 'b', 'to b');
    history = record(undo(history), 'c', 'to c');
    expect(redo(history).present).toBe('c');
    expect(undo(history).present).toBe('a');
  });

  it('melts the steps of one gesture into one, and keeps two gestures apart', () => {
    let history = newHistory(0);
    for (const value of [1, 2, 3]) history = record(history, value, 'drag', 'drag 1');
    for (const value of [4, 5]) history = record(history, value, 'drag', 'drag 2');
    expect(undo(history).present).toBe(3);
    expect(undo(undo(history)).present).toBe(0);
  });

  it('does not record what changes nothing', () => {
    const history = newHistory(7);
    expect(record(history, 7, 'nothing')).toBe(history);
  });

  it('after any walk of edits, undoing all and redoing all ends where it was', () => {
    const walk = fc.array(
      fc.record({
        value: fc.integer(),
        gesture: fc.option(fc.constantFrom('a', 'b')),
      }),
    );
    fc.assert(
      fc.property(walk, (steps) => {
        let history = newHistory(0);
        for (const { value, gesture } of steps) history = record(history, value, 'step', gesture);
        const last = history.present;
        const count = history.past.length;
        for (let i = 0; i < count; i += 1) history = undo(history);
        expect(history.present).toBe(0);
        for (let i = 0; i < count; i += 1) history = redo(history);
        expect(history.present).toBe(last);
      }),
    );
  });
});
