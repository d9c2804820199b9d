"use client";

import { type FormAction, useAnswer } from "@/components/shell/use-answer";

/** One of the demo's accounts. */
export interface DemoAccount {
  email: string;
  password: string;
  role: string;
}

/** Someone of the demo's cast with what the kiosk asks for. */
export interface DemoWorker {
  worker: string;
  pin: string;
  cell: string;
}

/** The demo's accounts, a button each, and whom to be at the kiosk. Never shown outside the demo. */
export function DemoSignIns({
  action,
  to,
  accounts,
  workers,
}: {
  action: FormAction<unknown>;
  /** The page to go on to. */
  to: string;
  accounts: readonly DemoAccount[];
  workers: readonly DemoWorker[];
}) {
  const sent = useAnswer(action);
  return (
    <section>
      <h2 className="text-t-5">This is the demo</h2>
      <p className="mt-2">Larkmoor Stringworks is invented. Be anyone:</p>
      <ul className="mt-3 grid gap-2">
        {accounts.map(({ email, password, role }) => (
          <li key={email}>
            <form action={sent.send} className="desk-demo">
              <input type="hidden" name="to" value={to} />
              <input type="hidden" name="email" value={email} />
              <input type="hidden" name="password" value={password} />
              <button type="submit" className="button" data-rim="left" disabled={sent.isSending}>
                {role}
              </button>
              <span>
                <code>
                  {email.split("@")[0]}
                  <wbr />@{email.split("@")[1]}
                </code>
                <br />
                <code>{password}</code>
              </span>
            </form>
          </li>
        ))}
      </ul>
      <p className="mt-4">
        At the kiosk, number and PIN:
        {workers.map(({ worker, pin, cell }) => (
          <span key={worker} className="block">
            {cell} <code>{worker}</code> <code>{pin}</code>
          </span>
        ))}
      </p>
    </section>
  );
}
