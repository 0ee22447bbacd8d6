/** Rises with every change that can move a result's digits; stored with each computed result. */
export const ENGINE_VERSION = '1.0.0';
