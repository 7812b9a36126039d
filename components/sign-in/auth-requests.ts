/**
 * next-auth's own endpoints, asked directly. Its browser client leaves the page when the server
 * can't be reached, and what was typed would be gone with it; these throw instead.
 */
const BASE = '/api/auth';

/** Null when signed in, else the code that `signInWords` puts into words. */
export async function requestSignIn(email: string, password: string): Promise<string | null> {
  const { url } = await post('callback/credentials', { email, password });
  const refused = new URL(url, window.location.origin).searchParams.get('error');
  return refused;
}

export async function requestSignOut(): Promise<void> {
  await post('signout', {});
}

async function post(path: string, fields: Record<string, string>): Promise<{ url: string }> {
  const { csrfToken } = await json<{ csrfToken: string }>(await fetch(`${BASE}/csrf`));
  const answer = await fetch(`${BASE}/${path}`, {
    method: 'POST',
    body: new URLSearchParams({ ...fields, csrfToken, callbackUrl: '/', json: 'true' }),
  });
  return json(answer);
}

/** A refused sign-in answers 401 with JSON; a proxy's error page answers with neither. */
async function json<Answer>(response: Response): Promise<Answer> {
  return (await response.json()) as Answer;
}
