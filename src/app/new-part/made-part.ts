import type { CreatePart, Part } from '@shared/contracts/parts';
import { firstValueFrom } from 'rxjs';
import type { Server } from '../server/server';

/** The part of this number, as it stands in the register, when this person made it; otherwise null. */
export async function partMadeBy(server: Server, number: string, person: string | undefined): Promise<Part | null> {
  const { parts } = await firstValueFrom(server.parts({ search: number }));
  // As the register takes numbers: one part, whatever the case.
  const row = parts.find((one) => one.number.toLowerCase() === number.toLowerCase());
  const part = row && (await firstValueFrom(server.part(row.id)));
  return part?.createdBy === person ? (part ?? null) : null;
}

/** Whether both ask for the same part. */
export const sameNumber = (one: CreatePart | null, other: CreatePart): boolean =>
  one !== null && one.number.toLowerCase() === other.number.toLowerCase();
