/** Stands in for zod's folder of some sixty languages in the bundle: the app speaks English, so one is enough. */
export { default as en } from 'zod/v4/locales/en.js';
