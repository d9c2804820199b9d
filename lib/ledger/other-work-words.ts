/** An other-work code in words, for the office: `waiting-material` is "waiting material". */
export function otherWorkWords(code: string | null): string {
  return (code ?? "other work").replaceAll("-", " ");
}
