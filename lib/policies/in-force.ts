import { assert } from "@/lib/assert";
import type { PayPolicy } from "@/lib/pay/schema";

/** One version of a named policy; versions are only added, none is changed. */
export interface PolicyVersion {
  name: string;
  /** From 1, by name. */
  version: number;
  /** Site date: it governs the workweeks that begin on it or later. */
  effectiveOn: string;
  policy: PayPolicy;
}

/** Which policy someone is paid by, from a site date on. */
export interface PolicyChoice {
  /** The id of a worker; null for the whole site. */
  worker: string | null;
  /** Name of a policy; null puts a worker back to the site's. */
  policy: string | null;
  effectiveOn: string;
}

/** All that a site ever set about pay policies, each list in the order of entry. */
export interface PolicyBook {
  versions: readonly PolicyVersion[];
  choices: readonly PolicyChoice[];
}

/** What a version is called wherever it is shown, frozen or agreed to: "straight 2". */
export function policyLabel({ name, version }: Pick<PolicyVersion, "name" | "version">): string {
  return `${name} ${version}`;
}

/**
 * The policy version in force for a worker on a site date: the worker's own choice, else the site's,
 * in its version of that day. The latest that began by then counts, ties by the later entry. What is
 * older than a site's first choice, or a policy's first version, goes by that first one, so that no
 * day is without a rule.
 *
 * @param worker id of a worker, or null for the site's own
 * @returns null where the site has not chosen any policy yet
 */
export function policyOn(
  { versions, choices }: PolicyBook,
  worker: string | null,
  date: string,
): PolicyVersion | null {
  const own = worker === null ? undefined : latest(of(choices, worker), date);
  const ofSite = of(choices, null);
  const name = own?.policy ?? (latest(ofSite, date) ?? earliest(ofSite))?.policy ?? null;
  if (name === null) return null;
  const named = versions.filter((version) => version.name === name);
  const found = latest(named, date) ?? earliest(named);
  assert(found !== undefined, `policyOn: no version of ${name} was ever entered`);
  return found;
}

function of(choices: readonly PolicyChoice[], worker: string | null): PolicyChoice[] {
  return choices.filter((choice) => choice.worker === worker);
}

/** The latest that began by a date; of those of one day the one entered last. */
function latest<T extends { effectiveOn: string }>(rows: readonly T[], date: string) {
  return rows.reduce<T | undefined>((best, row) => {
    if (row.effectiveOn > date) return best;
    return best && best.effectiveOn > row.effectiveOn ? best : row;
  }, undefined);
}

/** The first to begin; of those of one day the one entered last. */
function earliest<T extends { effectiveOn: string }>(rows: readonly T[]) {
  return rows.reduce<T | undefined>(
    (best, row) => (best && best.effectiveOn < row.effectiveOn ? best : row),
    undefined,
  );
}
