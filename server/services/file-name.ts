/** A name that every file system takes, made from what a person typed. */
export const fileSafe = (text: string): string =>
  text
    .normalize('NFKD')
    .replace(/[^A-Za-z0-9._-]+/g, '-')
    .replace(/^[-.]+|[-.]+$/g, '')
    .toLowerCase() || 'unnamed';
