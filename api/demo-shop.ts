/** The invented shop and its invented people. They exist in a demo shop only. */
import type { Role } from '../shared/contracts/session';

export const DEMO_SHOP_NAME = 'Harrow Creek';

/** Printed at every start and shown on the sign-in page: it guards nothing. */
export const DEMO_PASSWORD = 'harrow-creek-demo';

export const DEMO_PEOPLE: readonly { email: string; name: string; roles: readonly Role[] }[] = [
  { email: 'designer@harrowcreek.example', name: 'Ilka Dornbach', roles: ['designer'] },
  { email: 'technician@harrowcreek.example', name: 'Tamo Reedling', roles: ['technician'] },
  { email: 'supervisor@harrowcreek.example', name: 'Senna Quillfeather', roles: ['supervisor'] },
  { email: 'administrator@harrowcreek.example', name: 'Odrin Maplewick', roles: ['administrator'] },
];
