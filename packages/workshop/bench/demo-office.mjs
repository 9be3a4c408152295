/** The password of all people of the invented office, printed at every start of it. */
const demoPassword = 'merestone-demo';

/**
 * @param {string} origin of a running demo office
 * @param {string} [role] the first part of the address
 * @returns {Promise<string>} the Cookie header of a new session
 */
export const signIn = async (origin, role = 'engineer') => {
  const response = await fetch(`${origin}/api/session`, {
    method: 'POST',
    headers: { 'content-type': 'application/json' },
    body: JSON.stringify({ email: `${role}@merestone.example`, password: demoPassword }),
  });
  if (!response.ok)
    throw new Error(`Signing in answered ${String(response.status)}: ${await response.text()}`);
  return response.headers
    .getSetCookie()
    .map((cookie) => cookie.split(';')[0] ?? '')
    .join('; ');
};

/**
 * @typedef {{ inputs: object, rows?: object, equations?: object }} Duty
 */

/**
 * An approved sheet and a duty that it answers: the inputs of one of its own worked checks.
 * @param {string} origin
 * @param {string} cookie
 * @returns {Promise<{ slug: string, title: string, duty: Duty }>}
 */
export const approvedSheet = async (origin, cookie) => {
  const headers = { cookie };
  /** @type {{ items: { slug: string }[] }} */
  const { items } = await (await fetch(`${origin}/api/correlations?standing=approved`, { headers })).json();
  for (const { slug } of items) {
    const address = `${origin}/api/correlations/${slug}`;
    /** @type {{ title: string, definition: { checks: Duty[] } }} */
    const { title, definition } = await (await fetch(address, { headers })).json();
    for (const { inputs, rows, equations } of definition.checks) {
      const duty = { inputs, rows, equations };
      const answer = await fetch(`${address}/evaluations`, {
        method: 'POST',
        headers: { ...headers, 'content-type': 'application/json' },
        body: JSON.stringify(duty),
      });
      if (answer.ok) return { slug, title, duty };
    }
  }
  throw new Error('No approved sheet answers one of its own checks.');
};
