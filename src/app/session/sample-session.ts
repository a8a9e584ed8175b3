import type { Role, Session } from '@shared/contracts/session';

/** For specs: an answer of `/api/session` in an invented shop. */
export function sampleSession(roles: readonly Role[] | null, csrfToken = 'token-1'): Session {
  return {
    person: roles === null ? null : { id: 'p1', email: 'designer@shop.example', name: 'Wren Adler', roles: [...roles] },
    shop: {
      name: 'Test shop',
      demo: true,
      demoSignIns: [
        { email: 'designer@shop.example', roles: ['designer'] },
        { email: 'supervisor@shop.example', roles: ['supervisor'] },
      ],
      demoPassword: 'test-shop-demo',
    },
    csrfToken,
    version: '0.1.0',
  };
}
