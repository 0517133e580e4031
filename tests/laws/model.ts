/**
 * The referee: the meter equations once more, in 40-digit decimal arithmetic, typed from the standards' formulas and
 * sharing nothing with the core. It answers with the residual of an equation and its slope, so that the distance of a
 * solution from the true root is known to far more digits than a double has.
 */
import Decimal from 'decimal.js';

const D40 = Decimal.clone({ precision: 40, toExpNeg: -100, toExpPos: 100 });
type D = InstanceType<typeof D40>;
export const decimal = (x: number | string): D => new D40(x);
const ONE = decimal(1);
const PI = D40.acos(-1);

/** A meter in decimals; `element` is the code of kind and variant. */
export interface Exact {
  readonly element: string;
  readonly pipe: D;
  readonly density: D;
  readonly viscosity: D;
  readonly pressure: D;
  /** Absent for a liquid. */
  readonly exponent?: D;
  /** What the sheet of an averaging pitot says; a width of nothing where K counts the whole pipe. */
  readonly bar?: { readonly coefficient: D; readonly expansion: D; readonly width: D };
}

/** ISO 5167-2:2022, Formula (4). */
function orifice(tappings: string, b: D, Re: D, pipe: D): D {
  const mm = pipe.times(1000);
  const [L1, L2] = {
    corner: [decimal(0), decimal(0)],
    flange: [decimal('25.4').div(mm), decimal('25.4').div(mm)],
    'D-D/2': [ONE, decimal('0.47')],
  }[tappings] as [D, D];
  const A = b.times(19000).div(Re).pow('0.8');
  const M = L2.times(2).div(ONE.minus(b));
  const b4 = b.pow(4);
  const hundred = decimal('1e6');
  let C = decimal('0.5961').plus(b.pow(2).times('0.0261')).minus(b.pow(8).times('0.216'));
  C = C.plus(hundred.times(b).div(Re).pow('0.7').times('0.000521'));
  C = C.plus(A.times('0.0063').plus('0.0188').times(b.pow('3.5')).times(hundred.div(Re).pow('0.3')));
  const tap = decimal('0.043').plus(L1.times(-10).exp().times('0.080')).minus(L1.times(-7).exp().times('0.123'));
  C = C.plus(
    tap
      .times(ONE.minus(A.times('0.11')))
      .times(b4)
      .div(ONE.minus(b4)),
  );
  C = C.minus(M.minus(M.pow('1.1').times('0.8')).times(b.pow('1.3')).times('0.031'));
  if (mm.lt('71.12'))
    C = C.plus(
      decimal('0.75')
        .minus(b)
        .times(decimal('2.8').minus(mm.div('25.4')))
        .times('0.011'),
    );
  return C;
}

/** C of every element inside its Reynolds limits. */
export function coefficient({ element, pipe, bar }: Exact, b: D, Re: D): D {
  if (bar !== undefined) return bar.coefficient;
  const [kind, variant = ''] = element.split('.');
  const mega = decimal('1e6');
  if (kind === 'orifice-plate') return orifice(variant, b, Re, pipe);
  if (kind === 'isa-1932-nozzle') {
    const slope = b.pow(2).times('0.00175').minus(b.pow('4.15').times('0.0033')); // ISO 5167-3:2022, Formula (5)
    return decimal('0.9900')
      .minus(b.pow('4.1').times('0.2262'))
      .minus(slope.times(mega.div(Re).pow('1.15')));
  }
  if (kind === 'long-radius-nozzle') return decimal('0.9965').minus(mega.times(b).div(Re).sqrt().times('0.00653')); // Formula (10)
  if (kind === 'venturi-nozzle') return decimal('0.9858').minus(b.pow('4.5').times('0.196')); // Formula (19)
  const constants: Record<string, string> = { 'as-cast': '0.984', machined: '0.995', fabricated: '0.985' }; // ISO 5167-4
  return decimal(constants[variant] as string);
}

/** Expansibility factor at x = dp/p1: ISO 5167-2:2022, Formula (5); that of the sheet; ISO 5167-3:2022, Formula (6) for all others. */
export function expansibility({ element, exponent: k, bar }: Exact, b: D, x: D): D {
  if (k === undefined) return ONE;
  if (bar !== undefined) return ONE.minus(bar.expansion.times(x).div(k)); // ε = 1 - a Δp/(κ p₁)
  const tau = ONE.minus(x);
  const b4 = b.pow(4);
  if (element.startsWith('orifice-plate')) {
    const factor = decimal('0.351').plus(b4.times('0.256')).plus(b.pow(8).times('0.93'));
    return ONE.minus(factor.times(ONE.minus(tau.pow(ONE.div(k)))));
  }
  const t2 = tau.pow(decimal(2).div(k));
  const first = k.times(t2).div(k.minus(1));
  const second = ONE.minus(b4).div(ONE.minus(b4.times(t2)));
  const third = ONE.minus(tau.pow(k.minus(1).div(k))).div(x);
  return first.times(second).times(third).sqrt();
}

/** E A of a bore, with A = (pi/4) d2; the area alone for a bar across the pipe, less a strip of its width where K says so. */
function sectionOf({ pipe, bar }: Exact, b: D): D {
  if (bar !== undefined) return PI.div(4).times(pipe.pow(2)).minus(bar.width.times(pipe));
  return PI.div(4)
    .times(b.times(pipe).pow(2))
    .div(ONE.minus(b.pow(4)).sqrt());
}

/** q_m - C E eps A sqrt(2 dp rho), as a share of q_m: ISO 5167-1:2022, Formula (1), and its form without a bore. */
export function residual(meter: Exact, b: D, massFlow: D, differential: D): D {
  const Re = massFlow.times(4).div(PI.times(meter.viscosity).times(meter.pipe));
  const epsilon = expansibility(meter, b, differential.div(meter.pressure));
  const flow = coefficient(meter, b, Re)
    .times(sectionOf(meter, b))
    .times(epsilon)
    .times(differential.times(meter.density).times(2).sqrt());
  return ONE.minus(flow.div(massFlow));
}

/**
 * Relative distance of x from the root of `f`, by one step of Newton with a slope from two 40-digit values a hair
 * apart; what it leaves out is the square of the distance.
 */
export function distance(x: number, f: (x: D) => D): number {
  const here = decimal(x);
  const hair = decimal('1e-12');
  const value = f(here);
  const slope = f(here.times(ONE.plus(hair)))
    .minus(value)
    .div(hair); // against ln x
  return value.div(slope).abs().toNumber();
}
