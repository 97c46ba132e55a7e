/** One text that somebody typed, and where it stands, in words. */
export interface KeptText {
  where: string;
  text: string;
  /** It went to the upholsterer, or came from there: the workshop changes its own copy only. */
  alreadySent?: boolean;
}

/** A row with texts that people typed. */
export interface KeptRow {
  texts: KeptText[];
  /** Part of the transaction that the row was read in: writes the row with its texts changed. */
  rewrite(change: (text: string) => string): Promise<unknown>;
}
