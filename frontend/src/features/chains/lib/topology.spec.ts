import { describe, expect, it } from 'vitest';

import type { VoltageFeedbackStage } from '../../../api/types';
import { gainOfResistors } from './resistors';
import { gainProblem, withCoupling, withResistors, withTopology, withWantedGain } from './topology';

const stage: VoltageFeedbackStage = {
  id: 's',
  name: 'Gain',
  kind: 'voltage-feedback',
  topology: 'inverting',
  deviceId: 'd',
  wantedGain: -10,
  feedbackOhm: 2000,
  gainOhm: 200,
};

const gainOf = (each: { topology: string; feedbackOhm: number; gainOhm?: number | null }) =>
  gainOfResistors(each.topology, each.feedbackOhm, each.gainOhm);

describe('withWantedGain', () => {
  it('keeps Rg and takes Rf from the series when that meets the gain', () => {
    expect(withWantedGain(stage, -5, 'E24')).toMatchObject({ gainOhm: 200, feedbackOhm: 1000, wantedGain: -5 });
  });

  it('takes a typed positive gain of an inverting stage as its size', () => {
    expect(withWantedGain(stage, 5, 'E24').wantedGain).toBe(-5);
  });

  it('looks for another Rg where the first would miss: ×5 is 1.2 kΩ over 300 Ω', () => {
    const five = withWantedGain({ ...stage, topology: 'non-inverting' }, 5, 'E24');
    expect(gainOf(five)).toBeCloseTo(5, 9);
  });

  it('comes within a few per cent in E24, closer in E96, and meets it when exact', () => {
    const wanted = 10 ** (17 / 20);
    const missed = (series: 'E24' | 'E96' | 'exact') =>
      Math.abs((gainOf(withWantedGain(stage, wanted, series)) ?? 0) / -wanted - 1);
    expect(missed('E24')).toBeLessThan(0.02);
    expect(missed('E96')).toBeLessThan(0.003);
    expect(missed('exact')).toBeLessThan(1e-12);
  });

  it('takes the wanted gain of a transimpedance stage in ohms', () => {
    const tia = withWantedGain({ ...stage, topology: 'transimpedance' }, 98e3, 'E24');
    expect(tia).toMatchObject({ feedbackOhm: 100e3, gainOhm: null, wantedGain: -98e3 });
  });

  it('holds Rf near its value for current feedback', () => {
    const driver = { ...stage, kind: 'current-feedback' as const, topology: 'inverting' as const, feedbackOhm: 750 };
    const two = withWantedGain(driver, -2, 'E24');
    expect(Math.abs((gainOf(two) ?? 0) / -2 - 1)).toBeLessThan(0.05);
    expect(two.feedbackOhm).toBeGreaterThanOrEqual(750 / 1.2);
    expect(two.feedbackOhm).toBeLessThanOrEqual(750 * 1.2);
  });
});

describe('withTopology', () => {
  it('keeps the size of the gain and turns its sign', () => {
    const turned = withTopology(stage, 'non-inverting', 'E24');
    expect(turned.wantedGain).toBe(10);
    expect(gainOf(turned)).toBeCloseTo(10, 9);
  });

  it('makes a follower without resistors, and a gain of 2 out of one', () => {
    const follower = withTopology(stage, 'follower', 'E24');
    expect(follower).toMatchObject({ feedbackOhm: 0, gainOhm: null, wantedGain: 1 });
    expect(withTopology(follower, 'non-inverting', 'E24').wantedGain).toBe(2);
  });

  it('keeps Rf when it becomes a transimpedance stage', () => {
    expect(withTopology(stage, 'transimpedance', 'E24')).toMatchObject({ feedbackOhm: 2000, gainOhm: null });
  });

  it('gives a coupled + input its DC return, and takes it away for inverting', () => {
    const turned = withTopology({ ...stage, couplingF: 10e-9 }, 'non-inverting', 'E24');
    expect(turned.biasOhm).toBe(10e3);
    expect(withTopology(turned, 'inverting', 'E24').biasOhm).toBeNull();
    expect(withCoupling({ ...stage, topology: 'follower' }, 1e-9).biasOhm).toBe(10e3);
  });
});

describe('gainProblem and typed resistors', () => {
  it('refuses what the topology cannot do', () => {
    expect(gainProblem('non-inverting', 1)).toMatch(/follower/);
    expect(gainProblem('non-inverting', -3)).toMatch(/inverting/);
    expect(gainProblem('inverting', 0)).not.toBeNull();
    expect(gainProblem('inverting', 10)).toBeNull();
  });

  it('forgets the wanted gain when resistors are typed', () => {
    expect(withResistors(stage, { feedbackOhm: 1500 })).toMatchObject({
      wantedGain: null,
      feedbackOhm: 1500,
      gainOhm: 200,
    });
  });
});
