import { DEMO_PASSWORD } from '../../seed/accounts';
import { productUrl } from './browser';

/** The API of the running product with the rights of a demo person. Throws what it answered where it refuses. */
export async function apiOf(email: string) {
  const call = async (method: string, path: string, token: string | null, body?: object) => {
    const answer = await fetch(`${productUrl()}/api${path}`, {
      method,
      headers: {
        'content-type': 'application/json',
        ...(token && { authorization: `Bearer ${token}` }),
      },
      body: body && JSON.stringify(body),
    });
    return answer;
  };
  const read = async <T>(answer: Response): Promise<T> => {
    const text = await answer.text();
    if (!answer.ok) throw new Error(`${answer.url} answered ${answer.status}: ${text}`);
    return (text ? JSON.parse(text) : null) as T;
  };
  const signedIn = await call('POST', '/auth/sign-in', null, { email, password: DEMO_PASSWORD });
  const { accessToken } = await read<{ accessToken: string }>(signedIn);
  return {
    get: async <T>(path: string) => read<T>(await call('GET', path, accessToken)),
    send: async <T>(method: 'POST' | 'PUT', path: string, body: object = {}) =>
      read<T>(await call(method, path, accessToken, body)),
    status: async (path: string) => (await call('GET', path, accessToken)).status,
  };
}
