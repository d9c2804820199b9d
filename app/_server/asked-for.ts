/** The request header in which the proxy says which page was asked for, whatever the browser sent. */
export const ASKED_FOR = "x-bookmatch-asked-for";
