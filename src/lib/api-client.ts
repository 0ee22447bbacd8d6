import type { z } from 'zod';
import { NetworkError, problemOf } from './problem';
import { sessionExpired } from './session-expired';

type Method = 'GET' | 'POST' | 'PUT' | 'PATCH' | 'DELETE';

interface RequestOptions {
  body?: unknown;
  signal?: AbortSignal;
  /** The caller deals with 401 itself (the sign-in form). */
  quietUnauthorised?: boolean;
}

async function send(method: Method, path: string, options: RequestOptions): Promise<Response> {
  let response: Response;
  try {
    response = await fetch(`/api${path}`, {
      method,
      credentials: 'same-origin',
      headers: {
        accept: 'application/json',
        ...(method !== 'GET' && { 'content-type': 'application/json' }),
      },
      ...(options.body !== undefined && { body: JSON.stringify(options.body) }),
      ...(options.signal && { signal: options.signal }),
    });
  } catch (error) {
    if (error instanceof DOMException && error.name === 'AbortError') throw error;
    throw new NetworkError();
  }
  if (response.ok) return response;
  if (response.status === 401 && !options.quietUnauthorised) sessionExpired();
  throw await problemOf(response);
}

/** Sends a request and reads the answer through its schema: what is not as agreed never reaches a screen. */
export async function request<T extends z.ZodType>(
  method: Method,
  path: string,
  schema: T,
  options: RequestOptions = {},
): Promise<z.infer<T>> {
  const response = await send(method, path, options);
  return schema.parse(await response.json());
}

/** Sends a request whose answer has no body. */
export async function command(method: Method, path: string, options: RequestOptions = {}): Promise<void> {
  await send(method, path, options);
}

/** `{a: 1, b: undefined}` → `?a=1`. */
export function queryString(values: Record<string, string | number | undefined | null>): string {
  const search = new URLSearchParams();
  for (const [key, value] of Object.entries(values))
    if (value !== undefined && value !== null && value !== '') search.set(key, String(value));
  const text = search.toString();
  return text === '' ? '' : `?${text}`;
}
