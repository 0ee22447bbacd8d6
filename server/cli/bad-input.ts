/** What the person at the command line gave is wrong: one line on stderr, exit status 2. */
export class BadInput extends Error {}
