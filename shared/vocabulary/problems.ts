/** Every refusal the server gives, and the HTTP status it answers with. */
export const problemStatus = {
  'not-signed-in': 401,
  'sign-in-failed': 401,
  'not-allowed': 403,
  'forged-request': 403,
  'not-found': 404,
  'not-valid': 422,
  'stale-version': 409,
  'already-done': 409,
  'already-there': 409,
  'closed-case': 409,
  'wrong-state': 409,
  'not-ready': 409,
  'link-spent': 410,
  'too-large': 413,
  'not-this-kind': 415,
  'too-many-tries': 429,
  unexpected: 500,
  'not-now': 503,
} as const;
export type ProblemCode = keyof typeof problemStatus;
export const problemCodes = Object.keys(problemStatus) as [ProblemCode, ...ProblemCode[]];
