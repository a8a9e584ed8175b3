import { greeting } from './greeting';

describe('greeting', () => {
  it('of a demo shop has the address and every sign-in', () => {
    const words = greeting({ host: '127.0.0.1', shop: 'demo' }, 4300);
    expect(words).toContain('http://localhost:4300\n');
    for (const role of ['designer', 'technician', 'supervisor', 'administrator']) {
      expect(words).toContain(`${role}@harrowcreek.example`);
    }
    expect(words).toContain('harrow-creek-demo');
  });

  it('of an own shop has the address and nobody', () => {
    const words = greeting({ host: '192.168.1.5', shop: 'own' }, 80);
    expect(words).toContain('http://192.168.1.5:80');
    expect(words).not.toContain('@');
  });
});
