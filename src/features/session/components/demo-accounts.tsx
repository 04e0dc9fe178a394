import { Button } from '../../../components/ui/button';
import { SkeletonLines } from '../../../components/feedback/skeleton';
import { useDemoAccounts } from '../api/list-demo-accounts';

interface DemoAccountsProps {
  /** Fills the form with an account. */
  onChoose: (email: string, password: string) => void;
}

/** The accounts of the demo scenario; pressed, one fills the form. */
export function DemoAccounts({ onChoose }: DemoAccountsProps) {
  const { data, isPending } = useDemoAccounts();
  if (isPending) return <SkeletonLines lines={3} label="Reading the demo accounts" />;
  if (!data || data.length === 0) return null;
  return (
    <section aria-labelledby="demo-title" className="mt-6 border-t border-rule pt-4">
      <h2 id="demo-title" className="text-h3">
        Demo accounts
      </h2>
      <p className="text-table text-ink-soft">Everything in them is invented. Choose one, then sign in.</p>
      <ul className="mt-2">
        {data.map((account) => (
          <li
            key={account.email}
            className="grid grid-cols-[minmax(0,1fr)_auto] items-center gap-3 border-t border-rule py-2 text-table first:border-t-0"
          >
            <span className="min-w-0">
              <span className="font-semibold">{account.name}</span>
              <span className="block text-label text-ink-soft">{`${account.role}, ${account.organisation}`}</span>
            </span>
            <Button
              small
              aria-label={`Use the account of ${account.name}, ${account.role}`}
              onClick={() => onChoose(account.email, account.password)}
            >
              Use
            </Button>
          </li>
        ))}
      </ul>
    </section>
  );
}
