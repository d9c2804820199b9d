import Link from "next/link";

/** Leads to the next page of a list, at its foot on the day's rim. */
export function NextPage({
  path,
  query,
  after,
}: {
  path: string;
  query: Record<string, string | number | undefined>;
  after: string | number;
}) {
  const pairs = Object.entries({ ...query, after }).flatMap(([name, value]) =>
    value === undefined || value === "" ? [] : [[name, String(value)]],
  );
  return (
    <nav aria-label="Pages" className="desk-next">
      <Link className="button" data-rim="right" href={`${path}?${new URLSearchParams(pairs)}`}>
        Next page
      </Link>
    </nav>
  );
}
