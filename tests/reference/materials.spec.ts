import { findMaterial } from '../../shared/reference/materials';

const KSI = 6.894757293168361;
const G_PER_CM3 = 1000;
const LB_PER_IN3 = 27679.9047102;

describe('Typical properties of materials, against the printed tables', () => {
  it('Aluminum Association, typical (read in a text copy): 7075-T6 yield 73 ksi, E 10 400 ksi, 0.102 lb/in³', () => {
    const material = findMaterial('7075-T6')!;
    expect(material.yield / KSI).toBeCloseTo(73, 9);
    expect(material.modulus / KSI).toBeCloseTo(10400, 6);
    expect(material.density / LB_PER_IN3).toBeCloseTo(0.102, 9);
  });

  it('Aluminum Association, typical (read in a text copy): Alclad 2024-T3 yield 45 ksi, E 10 600 ksi', () => {
    const material = findMaterial('Alclad 2024-T3')!;
    expect(material.yield / KSI).toBeCloseTo(45, 9);
    expect(material.modulus / KSI).toBeCloseTo(10600, 6);
  });

  it('Aluminum Association, typical (read in a text copy): 6061-T6 40 ksi, 6061-O 8 ksi, E 10 000 ksi, 2.70 g/cm³', () => {
    expect(findMaterial('6061-T6')!.yield / KSI).toBeCloseTo(40, 9);
    expect(findMaterial('6061-O')!.yield / KSI).toBeCloseTo(8, 9);
    expect(findMaterial('6061-T6')!.modulus / KSI).toBeCloseTo(10000, 6);
    expect(findMaterial('6061-T6')!.density / G_PER_CM3).toBeCloseTo(2.7, 2);
  });

  it('AISI 304 data sheet, annealed (read in a text copy): yield 215 MPa, E 193 GPa, 0.289 lb/in³', () => {
    const material = findMaterial('304')!;
    expect(material.yield).toBe(215);
    expect(material.modulus).toBe(193000);
    expect(material.density / LB_PER_IN3).toBeCloseTo(0.289, 6);
  });

  it('4130 normalized, representative values (second-hand): yield 60 ksi, E 29 000 ksi, 0.283 lb/in³', () => {
    const material = findMaterial('4130N')!;
    expect(material.yield / KSI).toBeCloseTo(60, 9);
    expect(material.modulus / KSI).toBeCloseTo(29000, 6);
    expect(material.density / LB_PER_IN3).toBeCloseTo(0.283, 9);
  });

  it('takes a name to the letter, and no member of an object for one', () => {
    for (const name of ['7075-t6', ' 7075-T6', '', 'constructor', '__proto__', 'toString']) {
      expect(findMaterial(name)).withContext(name).toBeNull();
    }
  });
});
