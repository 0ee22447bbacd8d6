/** Free text as a LIKE pattern that finds it anywhere; its own % and _ stand for themselves. Use ESCAPE '\'. */
export const likePattern = (text: string): string => `%${text.replace(/[\\%_]/g, '\\$&')}%`;
