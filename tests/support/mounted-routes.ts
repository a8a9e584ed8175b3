/** Every route that Express really has, read from its own stack: nothing can be mounted past this list. */
import type { Express } from 'express';

interface Layer {
  readonly route?: { readonly path: string; readonly methods: Readonly<Record<string, boolean>> };
  readonly handle: { readonly stack?: readonly Layer[] };
}

function routesOf(stack: readonly Layer[]): string[] {
  return stack.flatMap(({ route, handle }) => {
    if (!route) return routesOf(handle.stack ?? []);
    // `_all` is the answer for methods that a path does not take.
    const methods = Object.keys(route.methods).filter((method) => method !== '_all');
    return methods.map((method) => `${method} ${route.path}`);
  });
}

/** @returns e.g. `get /api/parts/:id` */
export const mountedRoutes = (express: Express): string[] =>
  routesOf((express as unknown as { router: { stack: Layer[] } }).router.stack);
