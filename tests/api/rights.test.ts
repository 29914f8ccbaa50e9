import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { allRoutes } from '#server/all-routes.ts';
import type { Route } from '#server/http/route.ts';
import { openNewCase } from '#server/features/cases/service/open-a-case.ts';
import { caseActs, laboratoryActs } from '#shared/rules/may.ts';
import { aLaboratory, startTestServer, testPassword, type TestServer } from '../support/test-server.ts';
import type { ApiClient } from '../support/api-client.ts';
import {
  everyone,
  followers,
  mayInCase,
  mayOutsideCases,
  sees,
  type CaseSeen,
  type Someone,
} from './rights-expectations.ts';

let server: TestServer;
let clients: Record<Someone, ApiClient>;
let numbers: Record<CaseSeen, string>;
let people: Awaited<ReturnType<typeof aLaboratory>>;

beforeAll(async () => {
  server = await startTestServer();
  people = await aLaboratory(server);
  const visitor = server.visitor();
  await visitor.session();
  clients = {
    visitor,
    analyst: people.analyst.client,
    engineer: people.engineer.client,
    manager: people.manager.client,
    administrator: people.administrator.client,
    makerEngineer: people.makerEngineer.client,
    requester: people.requester.client,
    outsider: people.outsider.client,
  };
  const openFor = async (organisationId: string) =>
    (
      await openNewCase(people.analyst.context, {
        title: 'Bar, broke in test',
        summary: '',
        kind: 'test specimen',
        urgency: 'routine',
        organisationId,
        materialId: null,
        questions: [],
      })
    ).number;
  numbers = {
    'a case of the maker': await openFor(people.maker.id),
    'a case of another firm': await openFor(people.outside.id),
    'a restricted case of the maker': await openFor(people.maker.id),
  };
  const restricted = numbers['a restricted case of the maker'];
  const seen = await people.manager.client.get(`/cases/${restricted}`);
  const answered = await people.manager.client.put(`/cases/${restricted}/restriction`, {
    versionSeen: seen.body.version,
    restricted: true,
    namedPersonIds: [people.analyst.person.id, people.manager.person.id],
  });
  if (answered.status >= 300) throw new Error(`the case could not be restricted: ${JSON.stringify(answered.body)}`);
});
afterAll(() => server.stop());

const nameOf = (route: Route) => `${route.method.toUpperCase()} ${route.path}`;

/** The path with the case's number, and something no id looks like for the rest: who may is asked before what. */
const pathOf = (route: Route, number: string) => route.path.replace(':number', number).replaceAll(/:[a-zA-Z]+/g, 'zz');

/** Signs in again after a route that ends sessions. */
async function comeBack(who: Someone): Promise<void> {
  if (who === 'visitor') await clients.visitor.session();
  else await clients[who].signIn(people[who].mail, testPassword);
}

async function ask(who: Someone, route: Route, number: string) {
  return clients[who].ask(route.method.toUpperCase(), pathOf(route, number), route.method === 'get' ? undefined : {});
}

describe('the table of routes', () => {
  it('has an expectation for every act in a case and outside of cases', () => {
    expect(Object.keys(mayInCase).sort()).toEqual([...caseActs].sort());
    expect(Object.keys(mayOutsideCases).sort()).toEqual([...laboratoryActs].sort());
  });

  it('has a rule for every route, and one route for a method and path', () => {
    expect(allRoutes.length).toBeGreaterThan(20);
    expect(allRoutes.filter((route) => !route.rule).map(nameOf)).toEqual([]);
    expect(new Set(allRoutes.map(nameOf)).size).toBe(allRoutes.length);
  });

  it('asks for the case in every path below a case', () => {
    const astray = allRoutes.filter((route) => route.path.includes(':number') !== (route.rule.who === 'may in case'));
    expect(astray.map(nameOf)).toEqual([]);
  });
});

describe.each(allRoutes.map((route) => ({ name: nameOf(route), route })))('$name', ({ route }) => {
  const rule = route.rule;
  if (rule.who === 'may in case') {
    it.each(Object.keys(sees) as CaseSeen[])('lets only those who may at %s', async (which) => {
      for (const who of everyone) {
        const answered = await ask(who, route, numbers[which]);
        expect([who, kindOfAnswer(answered)]).toEqual([who, expectedInCase(who, which, rule.act)]);
      }
    });
  } else {
    it('lets only those who may', async () => {
      for (const who of everyone) {
        const answered = await ask(who, route, '');
        expect([who, kindOfAnswer(answered)]).toEqual([who, expectedOutside(who, rule)]);
        if (/session|password/.test(route.path)) await comeBack(who);
      }
    });
  }
});

type Kind = 'may' | 'not signed in' | 'not allowed' | 'nothing here';

function expectedInCase(who: Someone, which: CaseSeen, act: keyof typeof mayInCase): Kind {
  if (who === 'visitor') return 'not signed in';
  const seen: readonly Someone[] = sees[which];
  if (!seen.includes(who)) return 'nothing here';
  if (followers.includes(who)) return act === 'follow' ? 'may' : 'not allowed';
  return mayInCase[act].includes(who) ? 'may' : 'not allowed';
}

function expectedOutside(who: Someone, rule: Route['rule']): Kind {
  if (rule.who === 'anyone') return 'may';
  if (who === 'visitor') return 'not signed in';
  if (rule.who !== 'may') return 'may';
  return mayOutsideCases[rule.act].includes(who) ? 'may' : 'not allowed';
}

/** Whatever else is wrong with an empty request, who may do it comes first. */
function kindOfAnswer({ status, body }: { status: number; body: { code?: string; message?: string } }): Kind | number {
  if (status === 401 && body.code === 'not-signed-in') return 'not signed in';
  if (status === 403) return 'not allowed';
  if (status === 404 && body.message === 'Nothing here under this number.') return 'nothing here';
  if (status >= 500) return status;
  return 'may';
}
