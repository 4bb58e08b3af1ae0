/** What goes wrong in a way a person can mend; shown in its own words, without a stack. */
export class Trouble extends Error {}
