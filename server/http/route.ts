/**
 * A route is declared once, as data (see api-routes.ts): who may call it, what it takes, what it answers and
 * how it refuses. From the declaration come the checks in front of the handler, the handler's types and the
 * OpenAPI document.
 */
import type { ApiProblemCode } from '@shared/api/problem';
import { may, RIGHTS, type Right } from '@shared/api/rights';
import type { Person } from '@shared/api/session';
import express, { type Request, type RequestHandler, type Response, type Router } from 'express';
import * as z from 'zod';
import type { CsrfGuard } from './csrf';
import { ApiError, badInput, notFound } from './errors';
import { uploadBody, type UploadDeclaration } from './upload';
import { validated } from './validate';

/** Who may call a route: anyone, or people signed in with at least one of the rights. */
export type Access = 'anyone' | { readonly anyOf: readonly Right[] };

/** What a route answers when all goes well. */
export type RouteAnswer =
  | { readonly status: 200 | 201; readonly schema: z.ZodType }
  | { readonly status: 200; readonly file: 'application/json' | 'application/zip' | 'image/png' }
  | { readonly status: 200; readonly stream: 'text/event-stream' }
  | { readonly status: 204 };

export interface RouteDeclaration {
  readonly method: 'get' | 'post' | 'patch' | 'delete';
  /** Below /api. `:id` is a UUID, `:number` counts from 1. */
  readonly path: string;
  readonly summary: string;
  readonly access: Access;
  readonly query?: z.ZodType;
  readonly body?: z.ZodType;
  /** "layout" where a body may hold a whole layout or a long edit. */
  readonly bodyLimit?: 'layout';
  /** Instead of a body in JSON: one file. */
  readonly upload?: UploadDeclaration;
  readonly answer: RouteAnswer;
  /** Refusals of this route's own; those every such route shares follow from the rest. */
  readonly refusals: readonly ApiProblemCode[];
}

/** Greatest request bodies in bytes. A whole layout of 240 × 120 laid tile by tile stays under the second. */
export const BODY_LIMITS = { usual: 256 * 1024, layout: 2 * 1024 * 1024 } as const;

/** A file to be saved by the browser. */
export interface FileAnswer {
  readonly fileName: string;
  readonly content: string | Uint8Array;
}

/** What goes on answering after the handler has returned. */
export interface StreamAnswer {
  readonly open: (response: Response) => void;
}

type ParamsOf<Path extends string> = (Path extends `${string}/:id${string}`
  ? { readonly id: string }
  : unknown) &
  (Path extends `${string}/:number${string}` ? { readonly number: number } : unknown);

type OutputOf<S> = S extends z.ZodType ? z.output<S> : undefined;

export interface RouteCall<R extends RouteDeclaration> {
  readonly person: R['access'] extends 'anyone' ? Person | null : Person;
  readonly params: ParamsOf<R['path']>;
  readonly query: OutputOf<R['query']>;
  readonly body: OutputOf<R['body']>;
  readonly upload: R extends { upload: UploadDeclaration } ? Uint8Array : undefined;
  readonly request: Request;
}

type AnswerOf<R extends RouteDeclaration> = R['answer'] extends {
  schema: infer S extends z.ZodType;
}
  ? z.input<S>
  : R['answer'] extends { file: string }
    ? FileAnswer
    : R['answer'] extends { stream: string }
      ? StreamAnswer
      : undefined;

export type RouteHandler<R extends RouteDeclaration> = (
  call: RouteCall<R>,
) => Promise<AnswerOf<R>> | AnswerOf<R>;

/** What a route has done besides its checks. */
export interface RouteSteps {
  readonly beforeBody?: readonly RequestHandler[];
  readonly afterBody?: readonly RequestHandler[];
}

/** Puts handlers behind the checks their declarations ask for. */
export interface RouteMount {
  <const R extends RouteDeclaration>(route: R, handler: RouteHandler<R>, steps?: RouteSteps): void;
}

/**
 * A mount on this router. In order: signed in (401), token (403), right (403), steps `beforeBody`, size and
 * shape of the body (413, 400), steps `afterBody`, path (404), query (400), the handler.
 */
export function mountOn(router: Router, csrf: CsrfGuard): RouteMount {
  return (route, handler, { beforeBody = [], afterBody = [] } = {}) => {
    router[route.method](
      route.path,
      (request, _response, next) => {
        demandAccess(route, request, csrf);
        next();
      },
      ...beforeBody,
      ...(route.body ? [jsonBody(route)] : []),
      ...(route.upload ? [uploadBody(route.upload)] : []),
      ...afterBody,
      async (request, response) => {
        const answer = await handler(callOf(route, request));
        csrf.hand(request, response);
        sendAnswer(route, response, answer);
      },
    );
  };
}

function demandAccess(route: RouteDeclaration, request: Request, csrf: CsrfGuard): void {
  if (route.access !== 'anyone' && !request.user) {
    throw new ApiError(
      'not-signed-in',
      'You are not signed in, or were away too long. Sign in again.',
    );
  }
  if (route.method !== 'get') csrf.demand(request);
  if (route.access !== 'anyone') demandRight(request.user as Person, route.access.anyOf);
}

function demandRight(person: Person, rights: readonly Right[]): void {
  if (rights.some((right) => may(person.roles, right))) return;
  const holders = [...new Set(rights.flatMap((right) => [...RIGHTS[right]]))];
  throw new ApiError('not-allowed', `This takes the role of ${holders.join(' or ')}.`);
}

function jsonBody(route: RouteDeclaration): RequestHandler {
  return express.json({ limit: BODY_LIMITS[route.bodyLimit ?? 'usual'] });
}

function callOf<R extends RouteDeclaration>(route: R, request: Request): RouteCall<R> {
  const params = paramsOf(route, request);
  if (route.body && request.body === undefined) {
    throw badInput([{ field: '', message: 'must have a body in JSON (application/json)' }]);
  }
  return {
    person: request.user ?? null,
    params,
    query: route.query && validated(route.query, request.query),
    body: route.body && validated(route.body, request.body),
    upload: request.file?.buffer,
    request,
  } as RouteCall<R>;
}

const NUMBER_MOST = 2 ** 31 - 1;

/** The path's parameters. What cannot name anything is answered as what does not exist. */
function paramsOf(route: RouteDeclaration, request: Request): { id?: string; number?: number } {
  const { id, number } = request.params;
  const noun = route.path.startsWith('/layouts') ? 'layout' : 'commission';
  if (id !== undefined && !z.uuid().safeParse(id).success) throw notFound(noun);
  if (number === undefined) return { id: String(id) };
  if (!/^[1-9]\d{0,9}$/.test(String(number)) || Number(number) > NUMBER_MOST) {
    throw notFound('version');
  }
  return { id: String(id), number: Number(number) };
}

function sendAnswer(route: RouteDeclaration, response: Response, answer: unknown): void {
  if (route.answer.status === 204) {
    response.status(204).end();
  } else if ('stream' in route.answer) {
    // a browser that went meanwhile will never close it
    if (!response.destroyed) (answer as StreamAnswer).open(response);
  } else if ('file' in route.answer) {
    const { fileName, content } = answer as FileAnswer;
    response.attachment(fileName).type(route.answer.file);
    response.send(typeof content === 'string' ? content : Buffer.from(content));
  } else {
    response.status(route.answer.status).json(answer);
  }
}
