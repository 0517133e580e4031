/** The fluids offered. A new one is its own file and one line here. */
import { air } from './air/air.ts';
import { gas } from './gas/gas.ts';
import { liquid } from './liquid/liquid.ts';
import type { FluidModel } from './model.ts';
import { stated } from './stated/stated.ts';
import { water } from './water/water.ts';

/** In the order of a menu. */
export const fluids: readonly FluidModel[] = [water, gas, air, liquid, stated];
