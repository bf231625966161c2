import axios from 'axios';

import { toApiError } from './api-error';

/** The only axios instance. The header is the server's guard against forged requests from other sites. */
export const http = axios.create({
  baseURL: '/api',
  headers: { 'X-Requested-With': 'bandledger' },
  timeout: 30_000,
});

http.interceptors.response.use(undefined, (error: unknown) => Promise.reject(toApiError(error)));

export interface ReadOptions {
  readonly params?: Readonly<Record<string, unknown>>;
  readonly signal?: AbortSignal;
}

export async function getJson<T>(path: string, options: ReadOptions = {}): Promise<T> {
  return (await http.get<T>(path, options)).data;
}

export async function postJson<T>(path: string, body?: unknown, signal?: AbortSignal): Promise<T> {
  return (await http.post<T>(path, body, { signal })).data;
}

export async function putJson<T>(path: string, body: unknown): Promise<T> {
  return (await http.put<T>(path, body)).data;
}

export async function patchJson<T>(path: string, body: unknown): Promise<T> {
  return (await http.patch<T>(path, body)).data;
}

export async function deleteJson(path: string, params?: Readonly<Record<string, unknown>>): Promise<void> {
  await http.delete(path, { params });
}
