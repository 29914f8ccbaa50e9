import { visitorContext } from './http/context.ts';
import { inviteFirstAdministrator } from './database/first-administrator.ts';
import { seedDemo } from './database/seed.ts';
import { readSettings } from './settings.ts';
import { startServer } from './start-server.ts';

/** The program: start, say where it is, and stop when asked. */
async function main(): Promise<void> {
  const settings = readSettings(process.env);
  const server = await startServer(settings);
  for (const signal of ['SIGINT', 'SIGTERM'] as const) {
    process.once(signal, () => {
      void server.stop().then(() => process.exit(0));
    });
  }
  const context = visitorContext(server.parts);
  const accounts = settings.demo
    ? await seedDemo(server.parts, context, { onProgress: (words) => process.stdout.write(`${words}\n`) })
    : await inviteFirstAdministrator(context, { ...settings, address: server.address });
  process.stdout.write(`Hacklebook is at ${server.address}\n`);
  for (const line of accounts) process.stdout.write(`  ${line}\n`);
}

main().catch((error: unknown) => {
  process.stderr.write(`Hacklebook did not start. ${error instanceof Error ? error.message : String(error)}\n`);
  process.exit(1);
});
