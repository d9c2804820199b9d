/** Longer addresses than our pages ever have are no page of ours. */
const LENGTH_MAX = 1000;
/** Stands for our own address, whatever it is: a way that leaves it is somebody else's. */
const HERE = "https://here.invalid";

/**
 * The page to which someone goes on after signing in: the path and query that were asked for, or
 * "/" where that is no page of this site, so that no link can lead through the sign-in elsewhere.
 * The sign-in itself and the API are no pages to go on to.
 *
 * @param asked anything, as the address says it
 */
export function wayBack(asked: string): string {
  if (!asked.startsWith("/") || !URL.canParse(asked, HERE)) return "/";
  const { origin, pathname, searchParams } = new URL(asked, HERE);
  const isOurs = origin === HERE && !pathname.startsWith("//");
  if (!isOurs || /^\/(sign-in|api|_next)(\/|$)/.test(pathname)) return "/";
  searchParams.delete("_rsc"); // what the browser's router adds to a page it reads ahead
  const path = searchParams.size > 0 ? `${pathname}?${searchParams}` : pathname;
  return path.length > LENGTH_MAX ? "/" : path;
}

/** The address of the sign-in that leads on to the page asked for. */
export function signInFor(asked: string): string {
  const path = wayBack(asked);
  return path === "/" ? "/sign-in" : `/sign-in?${new URLSearchParams({ to: path })}`;
}
