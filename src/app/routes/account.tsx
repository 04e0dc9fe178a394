import { AccountPage } from '../../features/session/components/account-page';

export function Component() {
  return <AccountPage />;
}
