import { Router, type Request, type Response } from 'express';
import { mayInLaboratory } from '#shared/rules/may.ts';
import { CasePath } from '#shared/contracts/ids.ts';
import { nothingHere, openCase } from '../rights/open-case.ts';
import { contextFor, personOf, visitorContext, type ContextParts } from './context.ts';
import { parse } from './parse.ts';
import { Problem } from './problem.ts';
import { sent, type Route } from './route.ts';

const statusOf = { made: 201, accepted: 202, nothing: 204 } as const;

/** Mounts a table of routes: who asks is checked here, by the rule each route states, before its handler runs. */
export function mountRoutes(routes: readonly Route[], parts: ContextParts): Router {
  const router = Router();
  for (const route of routes)
    router[route.method](route.path, (request, response) => answer(route, parts, request, response));
  return router;
}

async function answer(route: Route, parts: ContextParts, request: Request, response: Response): Promise<void> {
  const held = await admit(route, { ...parts, actId: actIdOf(request) }, request);
  const call = {
    ...held,
    params: route.params && parse(route.params, request.params),
    query: route.query && parse(route.query, request.query),
    body: route.body && parse(route.body, request.body ?? {}),
    request,
    response,
  };
  const value = await route.handle(call as never); // brand: read by the route's own contracts above
  if (value === sent) return;
  response.setHeader('Cache-Control', 'no-store');
  if (route.answers === 'nothing') response.status(204).end();
  else response.status(route.answers ? statusOf[route.answers] : 200).json(value ?? null);
}

async function admit(route: Route, parts: ContextParts, request: Request) {
  const person = personOf(request);
  if (route.rule.who === 'anyone') return { context: visitorContext(parts, person) };
  if (!person)
    throw new Problem('not-signed-in', 'You have been signed out. Sign in to go on; what you typed is kept.');
  const context = contextFor(person, parts);
  if (route.rule.who === 'may') {
    const allowed = mayInLaboratory(person, route.rule.act);
    if (!allowed.allowed) throw new Problem('not-allowed', allowed.reason);
  }
  if (route.rule.who !== 'may in case') return { context };
  const path = CasePath.safeParse(request.params);
  if (!path.success) throw nothingHere();
  return { context, heldCase: await openCase(context, path.data.number, route.rule.act) };
}

function actIdOf(request: Request): string | null {
  const id = request.get('x-act-id');
  return id && /^[0-9a-f-]{36}$/i.test(id) ? id : null;
}
