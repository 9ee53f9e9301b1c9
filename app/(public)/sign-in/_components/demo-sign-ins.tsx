import { Button } from '@/components/ui/button';

const password = 'raglan-demo-2027';
const accounts = [
  { email: 'coordinator@tern.example', says: 'League admin', of: 'Tern Estuary Basketball League' },
  { email: 'manager@tern.example', says: 'Team manager', of: 'Otters and Herons, Tern Estuary' },
  { email: 'referee@tern.example', says: 'Referee', of: 'Tern Estuary Basketball League' },
  { email: 'coordinator@pellbrook.example', says: 'League admin', of: 'Pellbrook Valley Football League' },
  { email: 'manager@pellbrook.example', says: 'Team manager', of: 'Pellbrook Valley Football League' },
  { email: 'decorator@quay.example', says: 'Decorator', of: 'for both leagues' },
];

/** The invented people of the demo, each a press away from the form. Only shown in demo mode. */
export function DemoSignIns({
  onChoose,
}: {
  onChoose: (account: { email: string; password: string }) => void;
}) {
  return (
    <section aria-labelledby="demo-sign-ins">
      <h2 id="demo-sign-ins" className="type-section">
        Demo sign-ins
      </h2>
      <p className="type-small text-dusk mt-1">
        Everybody here is invented. Choose one to fill the form; the password is{' '}
        <span className="type-code text-ink">{password}</span> for all.
      </p>
      <ul className="divide-hem border-hem mt-3 grid divide-y border-y">
        {accounts.map(({ email, says, of }) => (
          <li key={email} className="flex items-center justify-between gap-3 py-2">
            <span className="min-w-0">
              <span className="block font-[560]">
                {says} <span className="text-dusk font-[400]">{of}</span>
              </span>
              <span className="type-code text-dusk block break-all">{email}</span>
            </span>
            <Button
              size="sm"
              className="shrink-0 whitespace-nowrap"
              aria-label={`Fill in ${email}`}
              onClick={() => onChoose({ email, password })}
            >
              Fill in
            </Button>
          </li>
        ))}
      </ul>
    </section>
  );
}
