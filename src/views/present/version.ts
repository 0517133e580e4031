/** The version of the program, from the one place that states it. */
export { version } from '../../../package.json' with { type: 'json' };
