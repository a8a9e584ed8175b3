/** Undo and redo of whole values (plain data): they are small and never change, so keeping them all costs little. */
export interface History<Value> {
  readonly past: readonly Value[];
  readonly present: Value;
  readonly future: readonly Value[];
  /** What goes on under this name is one entry, from its first change until it ends. */
  readonly gesture: string | null;
}

const DEPTH = 500;

export const begin = <Value>(present: Value): History<Value> => ({ past: [], present, future: [], gesture: null });

export function change<Value>(history: History<Value>, next: Value, gesture: string | null): History<Value> {
  // Retyping what stands there is no change: it would be an undo that does nothing.
  if (next === history.present || JSON.stringify(next) === JSON.stringify(history.present)) return history;
  if (gesture !== null && gesture === history.gesture) return { ...history, present: next, future: [] };
  return { past: [...history.past, history.present].slice(-DEPTH), present: next, future: [], gesture };
}

export const endGesture = <Value>(history: History<Value>): History<Value> =>
  history.gesture === null ? history : { ...history, gesture: null };

/** Back to where the gesture began, as if it had not been. */
export function cancelGesture<Value>(history: History<Value>): History<Value> {
  const before = history.past.at(-1);
  if (history.gesture === null || before === undefined) return history;
  return { past: history.past.slice(0, -1), present: before, future: history.future, gesture: null };
}

export function undo<Value>(history: History<Value>): History<Value> {
  const before = history.past.at(-1);
  if (before === undefined) return history;
  const future = [history.present, ...history.future];
  return { past: history.past.slice(0, -1), present: before, future, gesture: null };
}

export function redo<Value>(history: History<Value>): History<Value> {
  const [after, ...future] = history.future;
  if (after === undefined) return history;
  return { past: [...history.past, history.present], present: after, future, gesture: null };
}
