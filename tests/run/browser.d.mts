/** Path of a browser, or null. */
export function findBrowser(): string | null;
/** Path of a browser; installs Debian's where that can be done without asking. */
export function requireBrowser(): string;
