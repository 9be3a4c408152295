import { api, ask } from '../../../shared/api/client';

/** Asks for a link to choose a new password; the words that come back are the same for every address. */
export async function askForPassword(email: string): Promise<string> {
  const { message } = await ask(api.POST('/api/password-resets', { body: { email } }));
  return message;
}

/** Chooses a new password; the link is used up and every session ends. */
export async function choosePassword(token: string, password: string): Promise<void> {
  await ask(api.POST('/api/password-resets/{token}', { params: { path: { token } }, body: { password } }));
}
