/** A place of the running head: its address and its word. */
export type Place = { to: string; words: string };
