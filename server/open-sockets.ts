import type { Logger } from 'pino';
import { openCaseEvents } from './collaboration/case-events.ts';
import { openFindingsSockets } from './collaboration/findings-sockets.ts';
import type { ContextParts } from './http/context.ts';
import type { UpgradeHandler } from './http/upgrades.ts';
import type { Settings } from './settings.ts';

/** The sockets of the server by the first part of their path below /sockets, and how they are closed. */
export async function openSockets(parts: ContextParts, settings: Settings, log: Logger) {
  const caseEvents = await openCaseEvents(parts, settings, log);
  const findings = await openFindingsSockets(parts, settings, log);
  const handlers: Record<string, UpgradeHandler> = { live: caseEvents.handle, findings: findings.handle };
  const stop = async () => {
    await findings.stop();
    await caseEvents.stop();
  };
  return { handlers, stop };
}
