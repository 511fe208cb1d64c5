import { describe, expect, it } from 'vitest';
import { cellText, tableAsCsv, tableAsTabs, type DataTable } from '../../../web/chart/dataTable.ts';
import { niceCeiling } from '../../../web/chart/niceAxis.ts';

const table: DataTable = {
  fileName: 'x',
  columns: [
    { title: 'input', key: 'input', text: String },
    { title: 'settlement (mm)', key: 'settlement_m', text: (value) => (value * 1000).toFixed(0) },
  ],
  rows: [
    ['clay, "soft"', 0.1 + 0.2],
    ['=1+1', NaN],
    ['-2 m', -0.5],
  ],
};

describe('a table', () => {
  it('is saved with every digit, quoted as RFC 4180 says, an unknown number as an empty cell', () => {
    expect(tableAsCsv(table)).toBe(
      'input,settlement_m\r\n"clay, ""soft""",0.30000000000000004\r\n\'=1+1,\r\n-2 m,-0.5\r\n',
    );
  });

  it('never hands a spreadsheet a formula out of a name', () => {
    for (const name of ['=1', '+cmd', '@x', '-cmd']) {
      expect(tableAsCsv({ ...table, rows: [[name, 1]] })).toContain(`\n'${name},1`);
      expect(tableAsTabs({ ...table, rows: [[name, 1]] })).toContain(`\n'${name}\t1`);
    }
  });

  it('is read rounded', () => {
    expect(cellText(table, 0, 1)).toBe('300');
    expect(cellText(table, 0, 0)).toBe('clay, "soft"');
  });
});

describe('the end of an axis', () => {
  it('is a round number that is not below the largest value', () => {
    expect(niceCeiling(0.93)).toBe(1);
    expect(niceCeiling(1)).toBe(1);
    expect(niceCeiling(1230)).toBe(1500);
    expect(niceCeiling(0)).toBe(1);
  });
});
