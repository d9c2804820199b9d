/** A table calls its tickets A, B, C; events carry digits. */
export function ticketOf(letter: string): string {
  return `9000${letter.charCodeAt(0)}`;
}

/** The letter of a ticket that `ticketOf` numbered. */
export function letterOf(ticket: string): string {
  return String.fromCharCode(Number(ticket.slice(4)));
}
