import { App } from 'antd';
import { RequireSignIn } from '../../shared/session/require-sign-in';

/** All pages behind the sign-in; messages and dialogs come with them, so that the sign-in page stays light. */
export function SignedInArea() {
  return (
    <App component={false}>
      <RequireSignIn />
    </App>
  );
}
