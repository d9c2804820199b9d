import type { Role } from "@/lib/access/roles";
import { cast } from "@/lib/demo/cast";
import type { CellName } from "@/lib/demo/cells";

/** Someone who signs in to the office of Larkmoor Stringworks. Every name is invented. */
export interface OfficeMember {
  name: string;
  email: string;
  password: string;
  roles: readonly Role[];
  /** The cells of a lead; empty for all others. */
  cells: readonly CellName[];
  /** The worker number of someone who also clocks labour; null for those who do not. */
  worker: string | null;
}

/** The inspector and the worker who sign in to the office, besides the leads. */
const INSPECTOR = "Roswitha Klamm";
const WORKER = "Lương Thị Hạnh";

/** A lead who also inspects. */
const LEAD_AND_INSPECTOR = "Ambrose Tollivant";

/** Everyone with an account: one for each role at least, and every lead. */
export const office: readonly OfficeMember[] = [
  desk("Helena Dunmarch", "admin"),
  desk("Corentin Abasolo", "planner"),
  desk("Winifred Ashgrove", "payroll"),
  ...cast.filter(({ leads }) => leads.length > 0).map(leadOf),
  { ...desk(INSPECTOR, "inspector"), worker: numberOf(INSPECTOR) },
  { ...desk(WORKER, "worker"), worker: numberOf(WORKER) },
];

function leadOf({ name, leads, number }: (typeof cast)[number]): OfficeMember {
  const lead = { ...desk(name, "lead"), cells: leads, worker: number };
  return name === LEAD_AND_INSPECTOR ? { ...lead, roles: ["lead", "inspector"] } : lead;
}

/** The password names the role and is printed with it: nothing in a demo is secret. */
function desk(name: string, role: Role): OfficeMember {
  const email = `${addressOf(name)}@larkmoor.example`;
  return { name, email, password: `larkmoor-demo-${role}`, roles: [role], cells: [], worker: null };
}

/** `Lương Thị Hạnh` writes from `luong.thi.hanh`. */
function addressOf(name: string): string {
  const plain = name.normalize("NFD").replace(/\p{M}/gu, "").replace(/đ/gi, "d");
  return plain.toLowerCase().replace(/[^a-z]+/g, ".");
}

function numberOf(name: string): string | null {
  return cast.find((person) => person.name === name)?.number ?? null;
}
