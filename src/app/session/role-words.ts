import type { Role } from '@shared/contracts/session';

/** What each role does here, in a technician's words. */
export const ROLE_WORDS: Readonly<Record<Role, { readonly name: string; readonly does: string }>> = {
  designer: { name: 'Designer', does: 'makes and changes drafts' },
  technician: { name: 'Technician', does: 'works at the brake' },
  supervisor: { name: 'Supervisor', does: 'checks and releases' },
  administrator: { name: 'Administrator', does: 'keeps the people' },
};

export const roleNames = (roles: readonly Role[]): string => roles.map((role) => ROLE_WORDS[role].name).join(', ');
