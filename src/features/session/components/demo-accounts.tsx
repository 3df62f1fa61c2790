interface DemoAccount {
  readonly email: string;
  readonly role: string;
  readonly password: string;
}

interface DemoAccountsProps {
  readonly accounts: readonly DemoAccount[];
  readonly onChoose: (account: DemoAccount) => void;
}

/** The accounts of the demo studio; pressing one fills the form. Exists in demo mode only. */
export function DemoAccounts({ accounts, onChoose }: DemoAccountsProps) {
  if (accounts.length === 0) return null;
  return (
    <section className="mt-3 border-t border-rule pt-2" aria-label="Demo accounts">
      <h2 className="text-13 font-sans! text-ink-2">This is a demo. Come in as</h2>
      <ul className="-ml-[9px] flex flex-wrap gap-x-1">
        {accounts.map((account) => (
          <li key={account.email}>
            <button type="button" className="opt underline decoration-rule-2 underline-offset-3" title={account.email} onClick={() => onChoose(account)}>
              {account.role}
              <span className="sr-only">, {account.email}</span>
            </button>
          </li>
        ))}
      </ul>
    </section>
  );
}
