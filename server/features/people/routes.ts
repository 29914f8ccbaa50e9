import { accountRoutes } from './routes/accounts.ts';
import { linkRoutes } from './routes/links.ts';
import { ownRoutes } from './routes/own.ts';
import { sessionRoutes } from './routes/session.ts';

/** Accounts, from the sign-in to one's own settings. */
export const peopleRoutes = [...sessionRoutes, ...linkRoutes, ...ownRoutes, ...accountRoutes];
