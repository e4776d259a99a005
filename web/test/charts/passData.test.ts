import { describe, expect, it } from 'vitest';
import { passData, thinned, timeOf } from '../../src/charts/passData';
import { passDetail, servedPasses, timeline } from '../mock/passes';
import { scenario, startMs } from '../mock/scenario';

const { stations, spacecraft } = scenario('mock');
const served = servedPasses(stations, spacecraft, startMs, startMs + 6 * 3_600_000)[0];
if (served === undefined) throw new Error('The invented scenario has no pass.');
const pass = passDetail(served, [], startMs);
const whole = timeline(served);

describe('the data of a pass', () => {
  it('count losses from the second that the service calls best', () => {
    const data = passData(pass, whole);
    expect(timeOf(data, data.bestIndex)).toBe(Date.parse(pass.bestUtc));
    expect(data.robustMarginDb[data.bestIndex]).toBe(Math.max(...data.robustMarginDb));
  });

  it('keep all columns in step when a long pass is thinned', () => {
    const thin = thinned(whole, 4);
    const rows = Math.ceil(whole.elevationDeg.length / 4);
    expect(thin.stepS).toBe(4);
    expect(thin.elevationDeg).toHaveLength(rows);
    expect(thin.waveforms.map((waveform) => waveform.marginDb.length)).toEqual(thin.waveforms.map(() => rows));
    expect(thin.elevationDeg[3]).toBe(whole.elevationDeg[12]);
    expect(thin.startUtc).toBe(whole.startUtc);
  });

  it('are left whole when they fit', () => {
    expect(passData(pass, whole).timeline).toBe(whole);
  });
});
