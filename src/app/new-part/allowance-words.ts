/** The allowance methods that a new part may start with, in plain words. */
export const ALLOWANCE_CHOICES = [
  {
    method: 'handbook',
    name: 'Handbook',
    says: 'The rule of the airframe mechanics handbook: 0.01743 R + 0.0078 T a degree.',
  },
  {
    method: 'k-factor',
    name: 'K-factor',
    says: 'You state where the neutral line lies: K times the thickness from the inside.',
  },
  { method: 'din-6935', name: 'DIN 6935', says: 'K follows from radius and thickness, as the standard has it.' },
  {
    method: 'rule-90',
    name: '90° rule',
    says: 'Shop rule by the hardness of the metal, scaled to other angles.',
  },
] as const;

export type StartMethod = (typeof ALLOWANCE_CHOICES)[number]['method'];

export const HARDNESS_CHOICES = [
  { hardness: 'soft', name: 'Soft (copper, brass)' },
  { hardness: 'medium', name: 'Medium (soft steel, aluminium)' },
  { hardness: 'hard', name: 'Hard (bronze, cold-rolled and spring steel)' },
] as const;
