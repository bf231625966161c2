import { describe, expect, it } from 'vitest';

import { buildDevice } from '../../../testing/builders';
import { newStage } from './stage-defaults';

describe('newStage', () => {
  it('starts a voltage-feedback stage at a gain where the device is stable', () => {
    const device = buildDevice({ kind: 'voltage-feedback', minimumStableGain: 12 });
    expect(newStage('s', 'voltage-feedback', device)).toMatchObject({
      topology: 'non-inverting',
      wantedGain: 12,
      feedbackOhm: 1100,
      gainOhm: 100,
    });
  });

  it('starts with a transimpedance stage behind a current source', () => {
    const stage = newStage('s', 'voltage-feedback', buildDevice(), true);
    expect(stage).toMatchObject({ topology: 'transimpedance', wantedGain: -10e3, feedbackOhm: 10e3, gainOhm: null });
  });

  it('makes no stage without a device of its kind', () => {
    expect(newStage('s', 'voltage-feedback', null)).toBeNull();
    expect(newStage('s', 'matched-block', buildDevice())).toBeNull();
    expect(newStage('s', 'rc-section', null)).toMatchObject({ kind: 'rc-section' });
  });
});
