import type { Page } from "@playwright/test";
import { parse } from "csv-parse/sync";
import pg from "pg";
import { badgeCode } from "@/lib/codes/badge-code";
import { showTicket } from "@/lib/codes/ticket-code";
import { expect, expectAccessible, test } from "@/tests/setup/browser";
import type { Installation } from "@/tests/setup/installation";
import { enterOffice, signInAs } from "@/tests/setup/office";

test.use({ viewport: { width: 1280, height: 800 } });

/** Whom the test is, and what waits in the cell: somebody of the demo who is not in just now. */
interface Cast {
  worker: string;
  pin: string;
  cell: string;
  tickets: string[];
}

async function ask<Row extends pg.QueryResultRow>(
  { ownerUrl }: Installation,
  sql: string,
  values: unknown[] = [],
): Promise<Row[]> {
  const client = new pg.Client({ connectionString: ownerUrl });
  await client.connect();
  const { rows } = await client.query<Row>(sql, values);
  await client.end();
  return rows;
}

/** Finds a worker who was not in today and whose cell has four tickets that nobody is on. */
async function castOf(
  bookmatch: Installation,
  workers: readonly { worker: string; pin: string; cell: string }[],
): Promise<Cast> {
  const out = await ask<{ number: string }>(
    bookmatch,
    `select number from workers w where not exists (
       select from shifts s where s.worker_id = w.id
          and (s.end_at is null or s.end_at > now() - interval '30 hours')
     ) order by number`,
  );
  const queue = await ask<{ cell: string; tickets: string[] }>(
    bookmatch,
    `select c.name as cell, array_agg(t.number order by t.due_on, t.seq) as tickets
       from tickets t
       join ticket_operations o on o.ticket_id = t.id and o.state = 'ready'
       join operations p on p.id = o.operation_id
       join cells c on c.id = p.cell_id
      where t.status = 'open'
      group by c.name
     having count(*) >= 4`,
  );
  for (const { worker, pin, cell } of workers) {
    const tickets = queue.find((each) => each.cell === cell)?.tickets;
    if (tickets && out.some(({ number }) => number === worker)) {
      return { worker, pin, cell, tickets };
    }
  }
  throw new Error("The demo has nobody who is out and whose cell has four tickets ready.");
}

/** The lead of a cell, and how a worker of it is called. */
async function leadOf(bookmatch: Installation, { cell, worker }: { cell: string; worker: string }) {
  const [lead] = await ask<{ email: string; name: string }>(
    bookmatch,
    `select a.email, w.name from accounts a
       join account_roles r on r.account_id = a.id and r.role = 'lead'
       join cells c on c.id = r.cell_id
       join workers w on w.number = $2
      where c.name = $1
      limit 1`,
    [cell, worker],
  );
  if (!lead) throw new Error(`The demo has no lead of ${cell}.`);
  return lead;
}

/** The same page, with nobody signed in. */
async function freshPage(page: Page): Promise<Page> {
  await page.context().clearCookies();
  return page;
}

interface TapRow {
  kind: string;
  at: Date;
}

/** What a worker tapped in the last half hour, in order. */
function tapsOf(bookmatch: Installation, worker: string): Promise<TapRow[]> {
  return ask<{ kind: string; at: Date }>(
    bookmatch,
    `select kind, at from clock_events
      where worker_number = $1 and received_at > now() - interval '30 minutes'
      order by at, seq`,
    [worker],
  );
}

const becomes: Record<string, "direct" | "indirect" | "rest" | "unassigned"> = {
  "shift-start": "unassigned",
  work: "direct",
  indirect: "indirect",
  "break-start": "rest",
  "break-end": "direct", // the shift's one break interrupts work and goes back to it
};

/** Reckons a shift's seconds from its taps alone: each runs to the next that changes what is done. */
function secondsOf(taps: readonly TapRow[]) {
  const seconds = { attended: 0, direct: 0, indirect: 0, rest: 0, unassigned: 0 };
  const changes = taps.filter(({ kind }) => becomes[kind] || kind === "shift-end");
  for (const [place, { kind, at }] of changes.entries()) {
    const next = changes[place + 1];
    const doing = becomes[kind];
    if (!next || !doing) continue;
    const second = (instant: Date) => Math.floor(instant.getTime() / 1000);
    const length = second(next.at) - second(at);
    seconds[doing] += length;
    seconds.attended += length;
  }
  return seconds;
}

const button = (page: Page, name: string | RegExp) => page.getByRole("button", { name }).first();

async function key(page: Page, digits: string): Promise<void> {
  for (const digit of digits) await page.getByRole("button", { name: digit, exact: true }).click();
}

/** A wedge scanner is a keyboard that types fast and ends in Enter. */
async function wedge(page: Page, text: string): Promise<void> {
  await page.evaluate((code) => {
    for (const each of [...code, "Enter"]) {
      document.body.dispatchEvent(
        new KeyboardEvent("keydown", { key: each, bubbles: true, cancelable: true }),
      );
    }
  }, text);
}

/** The tablet's owner says no to the camera: the number pad must do. */
async function refuseCamera(page: Page): Promise<void> {
  await page.evaluate(() => {
    const no = () => Promise.reject(new DOMException("refused", "NotAllowedError"));
    navigator.mediaDevices.getUserMedia = no;
  });
}

/** From what a ticket offers to the card that says the time runs on it. */
async function begin(page: Page): Promise<void> {
  await button(page, /^Run/).click();
  const started = page.getByRole("heading", { name: /Your time runs on it|Added to your bench/ });
  const caution = button(page, "Yes, start");
  await expect(started.or(caution)).toBeVisible();
  if (await caution.isVisible()) {
    await expectAccessible(page);
    await caution.click();
  }
  await expect(started).toBeVisible();
}

const bench = async (page: Page) => {
  await button(page, "My bench").click();
  await expect(button(page, "End shift")).toBeVisible();
};

test("a bench worker clocks a shift, and a server that goes away in the middle loses nothing", async ({
  bookmatch,
  signIns,
  withCamera,
  browser,
}) => {
  test.setTimeout(600_000);
  const { worker, pin, cell, tickets } = await castOf(bookmatch, signIns.workers);
  const [first = "", second = "", third = "", fourth = ""] = tickets;
  const context = await withCamera([
    { see: "nothing", seconds: 1 },
    { see: { kind: "code128", text: `T${first}` }, seconds: 3 },
    { see: { kind: "qrcode", text: `T${first}` }, seconds: 3 },
  ]);
  const page = await context.newPage();

  await test.step("an admin's code makes this browser a kiosk of the cell", async () => {
    const [code = ""] = (await bookmatch.command("enrol.ts", "--cell", cell)).split("\n");
    await page.goto("/kiosk");
    await page.getByLabel("Code").fill("AAAA-AAAA");
    await button(page, "Enrol").click();
    await expect(page.getByText("That code does not hold")).toBeVisible();
    await page.goto(`/kiosk/enrol?code=${code}`);
    await button(page, "Enrol").click();
    await expect(page.getByRole("heading", { name: "or key your number" })).toBeVisible();
    await expect(page.getByText("Connected")).toBeVisible();
    await expectAccessible(page);
  });

  await test.step("number, PIN and one tap start the shift", async () => {
    await key(page, worker);
    await button(page, "Next").click();
    await key(page, pin === "999999" ? "888888" : "999999");
    await expect(page.getByText("Number and PIN do not go together")).toBeVisible();
    await key(page, pin);
    await button(page, "Start shift").click();
    await expect(page.getByText("You are in")).toBeVisible();
    await expect(page.getByRole("heading", { name: "or key your number" })).toBeVisible();
  });

  await test.step("the badge alone opens the bench, and the camera reads the ticket", async () => {
    await wedge(page, badgeCode(worker));
    await expect(page.getByRole("heading", { name: "What is next?" })).toBeVisible();
    await expectAccessible(page);
    await button(page, "Scan a ticket").click();
    await expect(page.getByText(showTicket(first)).first()).toBeVisible();
    await begin(page);
    await bench(page);
    await expect(page.getByRole("img", { name: /min actual/ })).toBeVisible();
    await expectAccessible(page);
  });

  await test.step("a break interrupts the work and goes back to it", async () => {
    await button(page, "Break").click();
    await button(page, /^Rest/).click();
    await expect(page.getByRole("heading", { name: "Rest break" })).toBeVisible();
    await bench(page);
    await button(page, "Back to work").click();
    await expect(page.getByRole("heading", { name: "Break over" })).toBeVisible();
    await bench(page);
  });

  await test.step("a misread books nothing and names what is near", async () => {
    await refuseCamera(page);
    await button(page, "Change ticket").click();
    await expect(page.getByText("The camera is not allowed here. Key the number.")).toBeVisible();
    const wrong = second.slice(0, -1) + String((Number(second.at(-1)) + 1) % 10);
    await key(page, wrong);
    await button(page, "Find it").click();
    await expect(page.getByText("one digit is not right")).toBeVisible();
    await button(page, /Nearest in your cell/).click();
    await begin(page);
    await bench(page);
    await expect(page.getByText(showTicket(second)).first()).toBeVisible();
  });

  await test.step("a scanner adds a second ticket, and the time is shared", async () => {
    await button(page, "Add a ticket").click();
    await wedge(page, `T${third}`);
    await begin(page);
    await bench(page);
    await expect(page.getByRole("heading", { name: "2 tickets at once" })).toBeVisible();
    await expectAccessible(page);
  });

  await test.step("the server goes away: what is tapped is kept here and handed in later", async () => {
    await bookmatch.kill();
    await button(page, "Other work").click();
    await button(page, "Cleaning").click();
    await expect(page.getByText("Saved on this tablet")).toBeVisible();
    await expect(page.getByText("1 record kept here, sent later")).toBeVisible();
    await page.reload().catch(() => undefined);
    await bookmatch.start();
    await page.goto("/kiosk");
    await expect(page.getByText("Connected")).toBeVisible({ timeout: 30_000 });
    await wedge(page, badgeCode(worker));
    await button(page, /^Back to/).click();
    await bench(page);
  });

  await test.step("a count closes one ticket, and the other runs on", async () => {
    await button(page, "Done").click();
    await button(page, new RegExp(showTicket(second))).click();
    await expectAccessible(page);
    await button(page, "Done").click();
    await expect(page.getByRole("heading", { name: "Done and counted" })).toBeVisible();
    await bench(page);
    await expect(page.getByText(showTicket(third)).first()).toBeVisible();
  });

  await test.step("a count that was wrong is called out, for the lead to settle", async () => {
    await button(page, /My hours/).click();
    await expectAccessible(page);
    await button(page, /^Wrong count/).click();
    await expect(page.getByRole("heading", { name: "Your lead will look at it" })).toBeVisible();
    await bench(page);
  });

  await test.step("a wrong ticket, noticed late, is put right with the PIN", async () => {
    await button(page, "Change ticket").click();
    await wedge(page, `T${fourth}`);
    await begin(page);
    await bench(page);
    await button(page, /My hours/).click();
    await button(page, /^Wrong ticket/).click();
    await key(page, pin);
    await expect(page.getByText("Which was it? Show it,")).toBeVisible();
    await wedge(page, `T${third}`);
    await button(page, /^Run/).click();
    await expect(page.getByRole("heading", { name: "Put right" })).toBeVisible();
    await bench(page);
    await expect(page.getByText(showTicket(third)).first()).toBeVisible();
    await expect(page.getByText(showTicket(fourth))).toHaveCount(0);
    await expect(page.getByText("Connected")).toBeVisible();
  });

  const office = await (await browser.newContext({ baseURL: bookmatch.url })).newPage();
  await test.step("the cell's lead sees who is on which ticket, and the count called out", async () => {
    const { email, name } = await leadOf(bookmatch, { cell, worker });
    await signInAs(office, signIns.office.find((account) => account.email === email)!);
    await office.waitForURL(/floor/);
    await expect(office.getByRole("row", { name: showTicket(third) })).toContainText(name);
    const [called] = await ask<{ count: string }>(
      bookmatch,
      `select count(*) from loose_ends l join workers w on w.id = l.worker_id
        where l.code = 'objection' and not l.settled and w.number = $1`,
      [worker],
    );
    expect(called?.count).toBe("1");
  });

  await test.step("the shift ends after it was asked about, with the PIN", async () => {
    await button(page, "End shift").click();
    await expect(page.getByRole("heading", { name: "Work is still open" })).toBeVisible();
    await button(page, "End shift").click();
    await key(page, pin);
    await expect(page.getByRole("heading", { name: "Your shift is over" })).toBeVisible();
    await expect(page.getByRole("heading", { name: "or key your number" })).toBeVisible();
    await wedge(page, badgeCode(worker));
    await expect(page.getByRole("heading", { name: /Your PIN/ })).toBeVisible();
  });

  await test.step("every tap is in the ledger once, and every second of the shift is somewhere", async () => {
    await expect(page.getByText("Connected")).toBeVisible();
    const kinds = await ask<{ kind: string }>(
      bookmatch,
      `select kind from clock_events e
        where received_at > now() - interval '10 minutes' and worker_number = $1
        order by at, seq`,
      [worker],
    );
    expect(kinds.map(({ kind }) => kind).filter((kind) => kind !== "caution-read")).toEqual([
      "shift-start",
      "work",
      "break-start",
      "break-end",
      "work",
      "work",
      "indirect",
      "work",
      "report",
      "object",
      "work",
      "reassign",
      "shift-end",
    ]);
    const [sums] = await ask<{ span: string; seconds: string; open: string }>(
      bookmatch,
      `with mine as (
         select s.worker_id, s.start_at, s.end_at from shifts s join workers w on w.id = s.worker_id
          where w.number = $1 order by s.start_at desc limit 1
       )
       select extract(epoch from mine.end_at - mine.start_at) as span,
              sum(g.seconds) as seconds,
              count(*) filter (where g.end_at is null) as open
         from mine join segments g
           on g.worker_id = mine.worker_id and g.start_at >= mine.start_at
        group by mine.start_at, mine.end_at`,
      [worker],
    );
    expect(Number(sums?.seconds)).toBe(Number(sums?.span));
    expect(sums?.open).toBe("0");
  });

  await test.step("nothing of the shift stayed on the ticket that it was not", async () => {
    const wrong = await ask(
      bookmatch,
      `select g.ticket from segments g join workers w on w.id = g.worker_id
        where w.number = $1 and g.ticket = $2 and g.start_at > now() - interval '30 minutes'`,
      [worker, fourth],
    );
    expect(wrong).toEqual([]);
  });

  await test.step("the file of hours says what the taps say", async () => {
    await enterOffice(await freshPage(office), signIns, "payroll");
    await office.goto("/hours");
    const address = await office.getByRole("link", { name: "Save as CSV" }).getAttribute("href");
    const file = await (await office.request.get(address!)).text();
    const rows = parse(file, { columns: true, bom: true }) as Record<string, string>[];
    const row = rows.findLast((each) => each.worker === worker);
    const seconds = secondsOf(await tapsOf(bookmatch, worker));
    for (const [part, exact] of Object.entries(seconds)) {
      expect(Math.abs(Number(row?.[`${part}_hours`]) * 3600 - exact), part).toBeLessThan(36);
    }
    const parts = [row?.direct_hours, row?.indirect_hours, row?.rest_hours, row?.unassigned_hours];
    const sum = parts.reduce((total, hours) => total + Math.round(Number(hours) * 100), 0);
    expect(sum).toBe(Math.round(Number(row?.attended_hours) * 100));
    expect(sum).toBe(Math.floor((seconds.attended + 18) / 36));
    await office.context().close();
  });
});
