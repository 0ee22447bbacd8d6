/** Rises with every change that can move a result's digits; stored with each computed result. */
export const ENGINE_VERSION = '2.0.0';
