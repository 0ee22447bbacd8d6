/** Written into the database file's header, so that a restore can tell a Millpond file from any other. */
export const APPLICATION_ID = 0x4d504e44;
