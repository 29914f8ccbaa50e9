import type { Request, Response } from 'express';
import type { z } from 'zod';
import type { CaseAct, LaboratoryAct } from '#shared/rules/may.ts';
import type { HeldFor } from '../rights/open-case.ts';
import type { Context, VisitorContext } from './context.ts';

/** Who may call a route. Every route states one; the table of routes is what the rights test walks. */
export type RouteRule =
  | { readonly who: 'anyone' }
  | { readonly who: 'signed in' }
  | { readonly who: 'may'; readonly act: LaboratoryAct }
  | { readonly who: 'may in case'; readonly act: CaseAct };

export type Call<Params, Query, Body> = {
  readonly params: Params;
  readonly query: Query;
  readonly body: Body;
  readonly request: Request;
  readonly response: Response;
};

type ContextOf<Rule extends RouteRule> = Rule extends { who: 'anyone' }
  ? { readonly context: VisitorContext }
  : Rule extends { who: 'may in case'; act: infer Act extends CaseAct }
    ? { readonly context: Context; readonly heldCase: HeldFor<Act> }
    : { readonly context: Context };

type Read<Schema> = Schema extends z.ZodType ? z.output<Schema> : undefined;

export type RouteShape<
  Rule extends RouteRule,
  Params extends z.ZodType | undefined,
  Query extends z.ZodType | undefined,
  Body extends z.ZodType | undefined,
> = {
  readonly method: 'get' | 'post' | 'put' | 'patch' | 'delete';
  /** Below /api; a route of a case has `:number` in it. */
  readonly path: string;
  readonly rule: Rule;
  readonly params?: Params;
  readonly query?: Query;
  readonly body?: Body;
  /** Answers 201 for 'made', 202 for 'accepted', 204 for 'nothing'; without it 200. */
  readonly answers?: 'made' | 'accepted' | 'nothing';
  /** The value is sent as JSON; `sent` when the handler has answered by itself (files, streams). */
  handle(call: Call<Read<Params>, Read<Query>, Read<Body>> & ContextOf<Rule>): Promise<unknown>;
};

/** A route with its types folded away, as the table of routes holds it. */
export type Route = {
  readonly method: 'get' | 'post' | 'put' | 'patch' | 'delete';
  readonly path: string;
  readonly rule: RouteRule;
  readonly params?: z.ZodType;
  readonly query?: z.ZodType;
  readonly body?: z.ZodType;
  readonly answers?: 'made' | 'accepted' | 'nothing';
  handle(call: never): Promise<unknown>;
};

export const sent = Symbol('the handler has answered');

/** States a route; the types of its parts follow from its contracts and its rule. */
export function route<
  const Rule extends RouteRule,
  Params extends z.ZodType | undefined = undefined,
  Query extends z.ZodType | undefined = undefined,
  Body extends z.ZodType | undefined = undefined,
>(shape: RouteShape<Rule, Params, Query, Body>): Route {
  return shape as Route; // brand: the mount calls it only with what its own contracts have read
}
