import type { Role } from '@shared/contracts/session';

/** What each role can do here so far, in a technician's words. */
export const ROLE_WORDS: Readonly<Record<Role, { readonly name: string; readonly does: string }>> = {
  designer: { name: 'Designer', does: 'makes and changes drafts' },
  technician: { name: 'Technician', does: 'reads parts and prints papers' },
  supervisor: { name: 'Supervisor', does: 'reads parts and prints papers' },
  administrator: { name: 'Administrator', does: 'reads parts and prints papers' },
};

export const roleNames = (roles: readonly Role[]): string => roles.map((role) => ROLE_WORDS[role].name).join(', ');
