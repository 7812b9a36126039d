import { offline, problemFrom } from './problem';

type Sending = {
  readonly method?: 'GET' | 'POST' | 'PUT' | 'PATCH' | 'DELETE';
  readonly body?: unknown;
  /** The version this change was made from; the server refuses it if that isn't the newest. */
  readonly ifMatch?: number;
  readonly signal?: AbortSignal;
  /** Lets the browser finish sending after the page has closed; small bodies only. */
  readonly keepalive?: boolean;
};

/** One request to our own server. Throws `Problem` for every refusal and for no answer at all. */
export async function request<Answer>(path: string, sending: Sending = {}): Promise<Answer> {
  const headers: Record<string, string> = { accept: 'application/json' };
  if (sending.body !== undefined) headers['content-type'] = 'application/json';
  if (sending.ifMatch !== undefined) headers['if-match'] = `"${sending.ifMatch}"`;

  const response = await fetch(path, {
    method: sending.method ?? 'GET',
    headers,
    body: sending.body === undefined ? undefined : JSON.stringify(sending.body),
    signal: sending.signal,
    keepalive: sending.keepalive,
    credentials: 'same-origin',
  }).catch((cause: unknown) => {
    if (cause instanceof DOMException && cause.name === 'AbortError') throw cause;
    throw offline();
  });
  if (!response.ok) throw await problemFrom(response);
  // Cut off on its way, or a hotspot's own page in its place: either way the server wasn't reached.
  return (await response.json().catch(() => {
    throw offline();
  })) as Answer;
}

/** The path with its query; parameters left undefined or empty stay out. */
export function address(path: string, query: Record<string, string | number | undefined>): string {
  const search = new URLSearchParams();
  for (const [key, value] of Object.entries(query)) {
    if (value !== undefined && value !== '') search.set(key, String(value));
  }
  const text = search.toString();
  return text ? `${path}?${text}` : path;
}
