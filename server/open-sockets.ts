import type { Logger } from 'pino';
import type { ContextParts } from './http/context.ts';
import type { UpgradeHandler } from './http/upgrades.ts';
import type { Settings } from './settings.ts';

/** The sockets of the server by the first part of their path below /sockets, and how they are closed. */
export async function openSockets(_parts: ContextParts, _settings: Settings, _log: Logger) {
  const handlers: Record<string, UpgradeHandler> = {};
  return { handlers, stop: async () => undefined };
}
