/** Where Chromium is; null where it is not. */
export function findChromium(): string | null;
/** Installs what is missing where that is allowed; gives the names of what is missing still. */
export function ensureSystemPackages(): string[];
