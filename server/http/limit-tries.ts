import type { Request, RequestHandler } from 'express';
import { ipKeyGenerator, rateLimit } from 'express-rate-limit';
import { Problem } from './problem.ts';

// Far above what a whole laboratory behind one address types; it only keeps one machine from hashing passwords all day.
const mostAMinute = 240;

/** Where a request comes from, as far as the network says: an IPv4 address, or the network of an IPv6 one. */
export function machineOf(request: Request): string {
  return ipKeyGenerator(request.ip ?? 'unknown');
}

/** Refuses a machine that sends more sign-ins, links and passwords in a minute than people can type. */
export function limitTries(): RequestHandler {
  return rateLimit({
    windowMs: 60_000,
    limit: mostAMinute,
    standardHeaders: 'draft-8',
    legacyHeaders: false,
    keyGenerator: machineOf,
    skip: (request) => request.method === 'GET',
    handler: (_request, _response, next) =>
      next(new Problem('too-many-tries', 'Too many requests from this machine. Wait a minute, then try again.')),
  });
}
