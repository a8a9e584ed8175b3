import { begin, cancelGesture, change, endGesture, redo, undo } from './history';

describe('the history of a document', () => {
  it('goes back and forth through every change', () => {
    let history = change(change(begin('a'), 'b', null), 'c', null);
    history = undo(undo(history));
    expect(history.present).toBe('a');
    expect(undo(history)).toBe(history);
    history = redo(redo(history));
    expect(history.present).toBe('c');
    expect(redo(history)).toBe(history);
  });

  it('takes retyping the same for no change', () => {
    const history = begin({ leg: 1 });
    expect(change(history, { leg: 1 }, 'leg 0')).toBe(history);
    expect(change(history, { leg: 2 }, 'leg 0')).not.toBe(history);
  });

  it('keeps a gesture as one entry', () => {
    let history = begin('a');
    for (const typed of ['1', '1.', '1.5']) history = change(history, typed, 'leg 0');
    expect(undo(history).present).toBe('a');
  });

  it('starts a new entry once the gesture has ended, or another one begins', () => {
    const first = endGesture(change(begin('a'), 'b', 'leg 0'));
    expect(undo(change(first, 'c', 'leg 0')).present).toBe('b');
    expect(undo(change(change(begin('a'), 'b', 'leg 0'), 'c', 'leg 1')).present).toBe('b');
  });

  it('takes a gesture back whole', () => {
    const typing = change(change(change(begin('a'), 'b', null), 'c', 'leg 0'), 'd', 'leg 0');
    const cancelled = cancelGesture(typing);
    expect(cancelled.present).toBe('b');
    expect(undo(cancelled).present).toBe('a');
    expect(cancelGesture(endGesture(typing)).present).toBe('d');
  });

  it('forgets what was undone when something else is done', () => {
    const history = change(undo(change(begin('a'), 'b', null)), 'c', null);
    expect(redo(history).present).toBe('c');
  });

  it('changes nothing when nothing changes', () => {
    const history = begin('a');
    expect(change(history, 'a', null)).toBe(history);
  });
});
