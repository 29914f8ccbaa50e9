import type { Person } from '#shared/contracts/people.ts';

declare global {
  // Express keeps the signed-in user in a namespace of its own; this is how its types are told who that is.
  namespace Express {
    // eslint-disable-next-line @typescript-eslint/no-empty-object-type
    interface User extends Person {}
  }
}
