import type { en } from "@/lib/messages/en";

/** The catalogue's shape with any words in it: what a further language must have, key by key. */
type Words<T> = { [K in keyof T]: T[K] extends string ? string : Words<T[K]> };
export type Messages = Words<typeof en>;
