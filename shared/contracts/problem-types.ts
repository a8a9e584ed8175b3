/** `type` values; relative references, so that they mean the same on every shop's own server. */
export const PROBLEM = {
  badRequest: '/problems/bad-request',
  invalid: '/problems/invalid',
  signedOut: '/problems/signed-out',
  wrongCredentials: '/problems/wrong-credentials',
  tooManyAttempts: '/problems/too-many-attempts',
  forbidden: '/problems/forbidden',
  csrf: '/problems/csrf',
  notFound: '/problems/not-found',
  methodNotAllowed: '/problems/method-not-allowed',
  taken: '/problems/taken',
  stale: '/problems/stale',
  tooLarge: '/problems/too-large',
  unsupported: '/problems/unsupported',
  unavailable: '/problems/unavailable',
  internal: '/problems/internal',
} as const;
