import { STARTING_SECTIONS } from '@shared/part/starting-sections';
import type { NewPartValues } from './new-part-form';

/** For specs: the form as it stands when the page opens. */
export function sampleValues(change: Partial<NewPartValues> = {}): NewPartValues {
  const sizes = STARTING_SECTIONS.map((section) => [
    section.id,
    Object.fromEntries(section.sizes.map((size) => [size.key, size.initial.in])),
  ]);
  return {
    number: 'LW-1',
    title: 'Channel',
    way: 'section',
    unit: 'in',
    thickness: '0.040',
    radius: '0.16',
    width: '',
    material: '',
    method: 'handbook',
    k: '0.44',
    hardness: 'medium',
    section: 'channel',
    sizes: Object.fromEntries(sizes),
    chain: '',
    ...change,
  };
}
