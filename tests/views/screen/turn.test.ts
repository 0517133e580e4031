import { describe, expect, it } from 'vitest';
import { kindTo, pullTo, turnTo, unknownOf } from '../../../src/views/screen/field/turn.ts';
import { feedWater, openMeter } from './workbench.ts';

describe('turning the unknown round', () => {
  it('writes what was found into its field, so that the new question answers with the old figures', () => {
    const { store, solved, meter } = openMeter();
    const bore = solved().boreAsMeasured_m ?? Number.NaN;
    turnTo('differential', store.getState());
    expect(meter().find).toBe('differential');
    expect(meter().element?.bore).toMatch(/^\d+\.\d+ mm$/);
    expect(solved().points.maximum?.differential_Pa).toBeCloseTo(25_000, 0);
    turnTo('flow', store.getState());
    expect(meter().differential).toBe('250 mbar');
    expect(solved().points.maximum?.massFlow_kg_s).toBeCloseTo(60_000 / 3600, 4);
    turnTo('bore', store.getState());
    expect(meter().duty?.maximum).toBe('60 t/h');
    expect(Math.abs((solved().boreAsMeasured_m ?? 0) / bore - 1)).toBeLessThan(1e-7);
  });

  it('keeps the unit and the kind of flow that its field had', () => {
    const { store, meter } = openMeter({
      ...feedWater,
      find: 'flow',
      element: { ...feedWater.element, bore: '2.6 in' },
      duty: { maximum: '300 gal/min' },
    });
    turnTo('bore', store.getState());
    expect(meter().duty?.maximum).toMatch(/^\d+\.\d+ gal\/min$/);
    turnTo('differential', store.getState());
    expect(meter().element?.bore).toMatch(/ in$/);
  });

  it('changes nothing when the meter already asks for it', () => {
    const { store } = openMeter();
    const before = store.getState().project;
    turnTo('bore', store.getState());
    expect(store.getState().project).toBe(before);
  });

  it('turns a meter that cannot be solved without inventing a figure', () => {
    const { store, meter } = openMeter({ ...feedWater, differential: 'abc' });
    turnTo('flow', store.getState());
    expect(meter().find).toBe('flow');
    expect(meter().element?.bore).toBeUndefined();
  });

  it('reads a missing unknown as the bore', () => {
    expect(unknownOf(undefined)).toBe('bore');
    expect(unknownOf('flow')).toBe('flow');
  });
});

describe('pulling the edge of the bore', () => {
  it('makes the bore an input, to the hundredth of a millimetre, and finds the differential', () => {
    const { store, solved, meter } = openMeter();
    pullTo(0.6, store.getState());
    expect(meter().find).toBe('differential');
    expect(meter().element?.bore).toBe('61.36 mm'); // 0.6 of 102.26 mm
    expect(solved().find).toBe('differential');
  });

  it('leaves the flow the unknown where it is', () => {
    const { store, meter } = openMeter({
      ...feedWater,
      find: 'flow',
      element: { ...feedWater.element, bore: '60 mm' },
    });
    pullTo(0.5, store.getState());
    expect(meter().find).toBe('flow');
    expect(meter().element?.bore).toBe('51.13 mm');
  });
});

describe('choosing the kind of the element', () => {
  it('leaves the question alone where the element has a bore', () => {
    const { store, meter } = openMeter();
    kindTo('venturi-nozzle', store.getState());
    expect([meter().element?.kind, meter().find]).toEqual(['venturi-nozzle', 'bore']);
  });

  it('asks for the differential where it has none, in one step of undo', () => {
    const { store, solved, meter } = openMeter({
      ...feedWater,
      element: { ...feedWater.element, coefficient: '0.65' },
    });
    kindTo('averaging-pitot', store.getState());
    expect([meter().element?.kind, meter().find]).toEqual(['averaging-pitot', 'differential']);
    expect(solved().points.maximum?.C).toBe(0.65);
    turnTo('flow', store.getState());
    expect(meter().find).toBe('flow');
    store.getState().undo();
    store.getState().undo();
    expect([meter().element?.kind, meter().find]).toEqual(['orifice-plate', 'bore']);
  });

  it('leaves a flow that is asked for alone', () => {
    const { store, meter } = openMeter({ ...feedWater, find: 'flow' });
    kindTo('averaging-pitot', store.getState());
    expect(meter().find).toBe('flow');
  });
});
