import { useState } from 'react';

import { RESISTOR_SERIES, type ResistorSeries } from '../../lib/resistor-series';

const KEY = 'bandledger.resistor-series';

function read(): ResistorSeries {
  try {
    const stored = localStorage.getItem(KEY);
    return RESISTOR_SERIES.find((series) => series === stored) ?? 'E24';
  } catch {
    return 'E24';
  }
}

/** What a person snaps resistors to, remembered in this browser. */
export function useResistorSeries(): [ResistorSeries, (series: ResistorSeries) => void] {
  const [series, setSeries] = useState(read);
  const choose = (next: ResistorSeries) => {
    setSeries(next);
    try {
      localStorage.setItem(KEY, next);
    } catch {
      // Then it is chosen again next time.
    }
  };
  return [series, choose];
}
