import type { Finding } from '../../shared/result';
import { figuresOf, partOf } from './plain-part';

/** Findings of one code in a part of this chain. */
export function findingsOf(
  code: string,
  chain: readonly unknown[],
  more: Record<string, unknown> = {},
  shop?: unknown,
) {
  return figuresOf(partOf(chain, more), shop).findings.filter((finding) => finding.code === code);
}

export const levelsOf = (list: readonly Finding[]): string[] => list.map((finding) => finding.level);
