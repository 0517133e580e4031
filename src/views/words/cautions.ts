/** The cautions that apply to a meter, short, for the foot of a sheet and of the field views. */

export interface Service {
  readonly fluid: string; // kind of the document
  readonly phase: string;
  /** Name of the gauge liquid, where an instrument is given. */
  readonly gaugeLiquid?: string;
  readonly oxygen?: boolean;
}

const always: readonly string[] = [
  'A calculation aid. Custody transfer, statutory metering and the design of pressure equipment follow the contract, ' +
    'local codes and licensed practice.',
  'Before opening a joint: permit, isolate, depressurise, drain or vent to a safe place, prove zero. Pressure trapped ' +
    'behind a blocked leg gives no sign.',
];

const steam =
  'Steam: fill the legs with water before first service and give it time to condense. Never have both block valves ' +
  'and the equaliser open together: the legs drain and hot steam reaches the cell.';

const gauge: Readonly<Record<string, string>> = {
  mercury:
    'Mercury: poisonous vapour. Tray, overflow traps and a spill kit; never with aluminium, ammonia or acetylene.',
};

const oxygenService = 'Oxygen: parts cleaned for oxygen, no oil, grease, mercury or organic gauge liquid; open slowly.';

/** The cautions of one service, those that always hold first. */
export function cautions({ fluid, phase, gaugeLiquid, oxygen }: Service): readonly string[] {
  const liquid = gaugeLiquid === undefined ? undefined : gauge[gaugeLiquid];
  return [
    ...always,
    ...(fluid === 'water' && phase !== 'liquid' ? [steam] : []),
    ...(liquid === undefined ? [] : [liquid]),
    ...(oxygen === true ? [oxygenService] : []),
  ];
}
