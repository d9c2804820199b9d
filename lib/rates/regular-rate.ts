import { added, dividedBy, type Exact, exact, larger, times } from "@/lib/rates/exact";

/**
 * The regular rate of a workweek per hour (29 CFR 778.109): all pay for the hours worked, ordinary
 * extras and piece earnings included, divided by all hours worked. Null where no hour was worked.
 */
export function regularRate(pay: Exact, hours: Exact): Exact | null {
  return hours.numerator > 0n ? dividedBy(pay, hours) : null;
}

/** What overtime adds where the hours themselves are paid already: half the rate, or all of it. */
export function overtimePremium(rate: Exact, hours: { overtime: Exact; double: Exact }): Exact {
  return times(rate, added(times(exact(1, 2), hours.overtime), hours.double));
}

/**
 * What a flat sum adds under California's rule (Alvarado v. Dart Container, 2018): its rate is over
 * the regular hours alone, and each overtime hour earns one and a half times that, a double one
 * twice.
 */
export function flatSumPremium(rate: Exact, hours: { overtime: Exact; double: Exact }): Exact {
  return times(rate, added(times(exact(3, 2), hours.overtime), times(exact(2), hours.double)));
}

/**
 * The straight-time pay of piece work with a guaranteed hourly rate: the earnings, topped up to the
 * guarantee before any overtime (29 CFR 778.111(b)).
 */
export function guaranteedPay(pieceEarnings: Exact, guaranteedRate: Exact, hours: Exact): Exact {
  return larger(pieceEarnings, times(guaranteedRate, hours));
}

/** A monthly or semimonthly salary as a weekly one: × 12 or 24 ÷ 52 (29 CFR 778.113(b)). */
export function weeklySalary(salary: Exact, paidPerYear: 12 | 24): Exact {
  return times(salary, exact(paidPerYear, 52));
}

/**
 * The regular rate of a weekly salary: divided by the hours that it is meant to cover
 * (29 CFR 778.113(a)). In California it always covers 40 (Labor Code 515(d)).
 */
export function salaryRate(weekly: Exact, coversHours: Exact): Exact {
  return dividedBy(weekly, coversHours);
}

/**
 * The pay of a workweek under a salary that covers so many hours: the salary, the regular rate for
 * each hour beyond them, and half of it again for each hour over 40 (29 CFR 778.113(a), 778.322).
 */
export function salaryPay(weekly: Exact, coversHours: Exact, hours: Exact): Exact {
  const rate = salaryRate(weekly, coversHours);
  const beyond = times(rate, hoursOver(hours, coversHours));
  const overtime = { overtime: hoursOver(hours, exact(40)), double: exact(0) };
  return added(weekly, beyond, overtimePremium(rate, overtime));
}

/**
 * The pay of a fluctuating workweek (29 CFR 778.114): the salary covers whatever hours are worked,
 * so the regular rate is over all of them, and overtime adds half of it.
 */
export function fluctuatingPay(weekly: Exact, hours: Exact): Exact {
  const rate = regularRate(weekly, hours) ?? exact(0);
  const overtime = { overtime: hoursOver(hours, exact(40)), double: exact(0) };
  return added(weekly, overtimePremium(rate, overtime));
}

function hoursOver(hours: Exact, threshold: Exact): Exact {
  const over = added(hours, times(exact(-1), threshold));
  return larger(over, exact(0));
}
