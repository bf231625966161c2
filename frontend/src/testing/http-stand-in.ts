import {
  AxiosError,
  AxiosHeaders,
  type AxiosAdapter,
  type AxiosResponse,
  type InternalAxiosRequestConfig,
} from 'axios';
import { afterEach, beforeEach } from 'vitest';

import { http } from '../api/client';

/** A request as a stand-in sees it. */
export interface StandInRequest {
  readonly method: string;
  readonly path: string;
  readonly params: Readonly<Record<string, unknown>>;
  readonly body: unknown;
  readonly headers: Readonly<Record<string, unknown>>;
}

export type Answer = (request: StandInRequest) => unknown;

/** An answer other than 200. */
export class Refusal {
  constructor(
    readonly status: number,
    readonly body: unknown = {},
  ) {}
}

/** A request that never gets its answer. */
export const PENDING = Symbol('pending');

function requestOf(config: InternalAxiosRequestConfig): StandInRequest {
  return {
    method: (config.method ?? 'get').toUpperCase(),
    path: config.url ?? '',
    params: (config.params as Record<string, unknown> | undefined) ?? {},
    body: typeof config.data === 'string' ? (JSON.parse(config.data) as unknown) : config.data,
    headers: config.headers.toJSON(),
  };
}

function respond(config: InternalAxiosRequestConfig, status: number, data: unknown): AxiosResponse {
  const response = { data, status, statusText: '', headers: new AxiosHeaders(), config };
  if (status >= 400) throw new AxiosError(`status ${status}`, AxiosError.ERR_BAD_REQUEST, config, null, response);
  return response;
}

/**
 * Stands in for the server below axios, so that headers, errors and cancelling run as they do in the browser.
 * Answers are found by "METHOD /path"; a request without an answer fails the test with 599.
 */
export class HttpStandIn {
  readonly requests: StandInRequest[] = [];
  private readonly answers = new Map<string, Answer>();

  on(route: string, answer: unknown): this {
    this.answers.set(route, typeof answer === 'function' ? (answer as Answer) : () => answer);
    return this;
  }

  sent(method: string, path: string): StandInRequest[] {
    return this.requests.filter((request) => request.method === method && request.path === path);
  }

  readonly adapter: AxiosAdapter = async (config) => {
    const request = requestOf(config);
    this.requests.push(request);
    const answer = this.answers.get(`${request.method} ${request.path}`);
    if (!answer) return respond(config, 599, { code: 'no_answer', message: `no answer for ${request.path}` });
    const result = await answer(request);
    if (result === PENDING) return new Promise<AxiosResponse>(() => undefined);
    return result instanceof Refusal ? respond(config, result.status, result.body) : respond(config, 200, result);
  };
}

/** A fresh stand-in for each test of the file. */
export function standInForHttp(): { readonly current: HttpStandIn } {
  const real = http.defaults.adapter;
  const holder = { current: new HttpStandIn() };
  beforeEach(() => {
    holder.current = new HttpStandIn();
    http.defaults.adapter = holder.current.adapter;
  });
  afterEach(() => {
    http.defaults.adapter = real;
  });
  return holder;
}
