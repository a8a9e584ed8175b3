/** The variables of a part, each evaluated once, whatever order they stand in. */
import type { FieldError } from '../result';
import { compile, type Compiled, type Scope } from '../units/expression';
import type { Quantity } from '../units/quantity';
import type { Expression, Unit } from './document';

const NAME = /^[\p{L}_][\p{L}\p{N}_]*$/u;
const SHOWN_IN_CIRCLE = 8;

/**
 * @param variables names and their expressions, which may use each other
 * @param unit the part's unit
 * @returns every variable's value, or an error a broken variable (also when nothing uses it)
 */
export function evaluateVariables(
  variables: Readonly<Record<string, Expression>>,
  unit: Unit,
): { readonly scope: Scope; readonly errors: readonly FieldError[] } {
  const names = new Set(Object.keys(variables));
  const errors: FieldError[] = [];
  const compiled = new Map<string, Compiled>();
  for (const name of names) {
    const path = `variables/${name}`;
    if (!NAME.test(name)) {
      errors.push({ path, message: 'A variable is named with letters, digits and _ and starts with a letter.' });
      continue;
    }
    const outcome = compile(variables[name]!, unit, (other) => names.has(other));
    if (outcome.ok) compiled.set(name, outcome.value);
    else errors.push({ path, message: outcome.message });
  }
  if (errors.length > 0) return { scope: new Map(), errors };
  const scope = new Map<string, Quantity>();
  const { order, circle } = sorted(compiled);
  if (circle.length > 0) {
    const shown = circle.slice(0, SHOWN_IN_CIRCLE).join(' → ') + (circle.length > SHOWN_IN_CIRCLE ? ' → …' : '');
    const message = `These variables go round in a circle: ${shown} → ${circle[0]!}.`;
    return { scope, errors: [{ path: `variables/${circle[0]!}`, message }] };
  }
  for (const name of order) {
    const value = compiled.get(name)!.evaluate(scope);
    if (value.ok && Number.isFinite(value.value.value)) scope.set(name, value.value);
    else {
      const message = value.ok ? 'This gives no finite figure.' : value.message;
      return { scope, errors: [{ path: `variables/${name}`, message }] };
    }
  }
  return { scope, errors };
}

/** Names so that each comes after those it uses (iterative: a chain of ten thousand must not exhaust the stack). */
function sorted(compiled: ReadonlyMap<string, Compiled>): { order: string[]; circle: string[] } {
  const order: string[] = [];
  const state = new Map<string, 'open' | 'done'>();
  for (const root of compiled.keys()) {
    const path: { name: string; next: number }[] = [];
    const enter = (name: string): void => {
      state.set(name, 'open');
      path.push({ name, next: 0 });
    };
    if (!state.has(root)) enter(root);
    while (path.length > 0) {
      const top = path[path.length - 1]!;
      const used = compiled.get(top.name)!.variables[top.next];
      top.next += 1;
      if (used === undefined) {
        state.set(top.name, 'done');
        order.push(top.name);
        path.pop();
      } else if (!state.has(used)) {
        enter(used);
      } else if (state.get(used) === 'open') {
        const names = path.map((step) => step.name);
        return { order, circle: names.slice(names.indexOf(used)) };
      }
    }
  }
  return { order, circle: [] };
}
