/** The fluids offered. A new one is its own file and one line here. */
import type { FluidModel } from './model.ts';
import { stated } from './stated.ts';
import { water } from './water.ts';

export const fluids: readonly FluidModel[] = [water, stated];

/** Kinds that the project file knows and this version does not offer. */
export const notOffered: readonly string[] = ['gas', 'air', 'liquid'];
