/** What a shop knows and a part does not: its choices and limits. Everything is optional; a part can be solved without a shop. */
import * as z from 'zod';
import type { FieldError } from '../result';

/** Limits of common practice, which a shop may set for itself. None has a published source. */
export const COMMON_PRACTICE = {
  /** Run of a joggle over its depth. */
  joggleRun: 3,
  /** Hole edge to bend tangent line, in thicknesses. */
  holeToBend: 1.5,
  /** What bending along the grain adds to the least radius. */
  grainAlong: 1.5,
  /** Part of the tool radius by which a nose may differ from it. */
  noseMismatch: 0.1,
} as const;

/** Hole centre to a free edge, in diameters: AC 43.13-1B ch. 4, edge distance of rivets. */
export const HOLE_EDGE = 2;

const limit = z.number().positive().max(1000);

export const shopContextSchema = z.strictObject({
  brake: z.unknown().optional(),
  stock: z.unknown().optional(),
  /** Which table of minimum radii rules where they differ. */
  radiusRule: z.enum(['stricter', 'AC 43.13-1B', 'Aluminum Association']).optional(),
  limits: z
    .strictObject({
      joggleRun: limit.optional(),
      holeToBend: limit.optional(),
      holeEdge: limit.optional(),
      grainAlong: limit.optional(),
      noseMismatch: limit.optional(),
    })
    .optional(),
  springback: z.unknown().optional(),
  tolerances: z.unknown().optional(),
  rounding: z.unknown().optional(),
});

export type ShopContext = z.infer<typeof shopContextSchema>;

/** A shop's choices with the defaults of those it left open. */
export interface ShopRules {
  readonly radiusRule: NonNullable<ShopContext['radiusRule']>;
  readonly limits: Readonly<Record<keyof typeof COMMON_PRACTICE | 'holeEdge', number>>;
}

export type RestoredShop =
  { readonly ok: true; readonly rules: ShopRules } | { readonly ok: false; readonly errors: readonly FieldError[] };

const OPEN: ShopRules = { radiusRule: 'stricter', limits: { ...COMMON_PRACTICE, holeEdge: HOLE_EDGE } };

/**
 * The gate for a shop context of unknown origin.
 *
 * @param value anything; undefined and {} mean a shop that says nothing
 * @returns its rules, or the errors with paths that begin with `shop`
 * @example restoreShop({}).ok // true
 */
export function restoreShop(value: unknown): RestoredShop {
  if (value === undefined) return { ok: true, rules: OPEN };
  const parsed = shopContextSchema.safeParse(value, { jitless: true });
  if (!parsed.success) {
    const errors = parsed.error.issues.map((issue) => ({
      path: [
        'shop',
        ...issue.path.map(String),
        ...(issue.code === 'unrecognized_keys' ? issue.keys.slice(0, 1) : []),
      ].join('/'),
      message:
        issue.code === 'unrecognized_keys'
          ? 'There is no such field in a shop context.'
          : 'This does not hold what a shop context wants here.',
    }));
    return { ok: false, errors };
  }
  const { radiusRule = OPEN.radiusRule, limits = {} } = parsed.data;
  const given = Object.fromEntries(Object.entries(limits).filter(([, figure]) => figure !== undefined));
  return { ok: true, rules: { radiusRule, limits: { ...OPEN.limits, ...given } } };
}
