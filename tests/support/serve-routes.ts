import { readSettings } from '#server/settings.ts';
import { startServer } from '#server/start-server.ts';

// The server as a process of its own, without its pages, for tests that end it or measure it.
const server = await startServer(readSettings(process.env), { withoutPages: true });
process.once('SIGTERM', () => void server.stop().then(() => process.exit(0)));
process.stdout.write(`Hacklebook is at ${server.address}\n`);
