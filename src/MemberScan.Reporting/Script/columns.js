// What the table can show of a candidate.
'use strict';

(() => {
  const { figures, words } = memberScan;

  /**
   * A column of texts, sorted without regard to case.
   * @param {string} id
   * @param {string} title
   * @param {number} width
   * @param {boolean} isShown
   * @returns {TableColumn}
   */
  function text(id, title, width, isShown = false) {
    return {
      id, title, width, isShown, isNumber: false,
      show: (data, index) => data.textOf(id, index),
      value: (data, index) => data.textOf(id, index),
      keys(data) {
        const lower = data.texts.map((t) => t.toLowerCase());
        const order = Uint32Array.from(lower.keys()).sort((a, b) => (lower[a] < lower[b] ? -1 : lower[a] > lower[b] ? 1 : a - b));
        const rank = new Float64Array(order.length);
        order.forEach((number, place) => { rank[number] = place; });
        rank[0] = NaN;
        return Float64Array.from(data.text(id), (number) => rank[number]);
      },
    };
  }

  /**
   * A column of numbers in a shown unit.
   * @param {string} id
   * @param {string} title
   * @param {keyof BlockHead['units'] | undefined} unit
   * @param {number} width
   * @param {boolean} isShown
   * @returns {TableColumn}
   */
  function number(id, title, unit, width, isShown = false) {
    const isLength = id === 'station' || id === 'length';
    return {
      id, title, width, isShown, isNumber: true,
      show(data, index) {
        const value = data.number(id)[index];
        if (Number.isNaN(value)) return '';
        if (!unit) return figures.utilization(value);
        return isLength ? figures.fixed(value / data.units[unit].size, 3) : figures.inUnit(value, data.units[unit]);
      },
      value(data, index) {
        const value = data.number(id)[index];
        return Number.isNaN(value) ? '' : Number((unit ? value / data.units[unit].size : value).toPrecision(10));
      },
      keys: (data) => data.number(id),
    };
  }

  memberScan.columns = [
    {
      id: 'verdict', title: 'Verdict', width: 11, isShown: true, isNumber: false,
      show: (data, index) => `${words.symbols[data.byte('verdict')[index]]} ${words.verdicts[data.byte('verdict')[index]]}`,
      value: (data, index) => words.verdicts[data.byte('verdict')[index]],
      keys: (data) => Float64Array.from(data.byte('verdict'), (verdict) => [2, 0, 1][verdict]),
    },
    number('utilization', 'Utilization', undefined, 7.5, true),
    text('name', 'Name', 15, true),
    text('tag', 'Tag', 7, true),
    text('key', 'Key', 15),
    text('class', 'Class', 8),
    text('role', 'Role', 6.5, true),
    text('section', 'Section', 11, true),
    text('material', 'Material', 7, true),
    text('storey', 'Storey', 8, true),
    text('situation', 'Situation', 12, true),
    text('kind', 'Kind', 5),
    number('station', 'Station', 'length', 6, true),
    text('place', 'Place on the section', 10),
    text('criterion', 'Criterion', 12),
    number('stress', 'Stress', 'stress', 6),
    number('limit', 'Limit', 'stress', 6),
    number('strength', 'Yield strength', 'stress', 7),
    number('length', 'Length', 'length', 6),
    number('y', 'Point y', 'dimension', 6),
    number('z', 'Point z', 'dimension', 6),
    number('N', 'N', 'force', 6),
    number('Vy', 'Vy', 'force', 6),
    number('Vz', 'Vz', 'force', 6),
    number('T', 'T', 'moment', 6),
    number('My', 'My', 'moment', 6),
    number('Mz', 'Mz', 'moment', 6),
    text('reason', 'Reason', 10),
    text('forcesSource', 'Source of forces', 14),
  ];

  const unitOf = /** @type {Record<string, keyof BlockHead['units']>} */ ({
    station: 'length', length: 'length', stress: 'stress', limit: 'stress', strength: 'stress', y: 'dimension', z: 'dimension',
    N: 'force', Vy: 'force', Vz: 'force', T: 'moment', My: 'moment', Mz: 'moment',
  });

  memberScan.titleOf = (column, data) => (unitOf[column.id] ? `${column.title} [${data.units[unitOf[column.id]].symbol}]` : column.title);
})();
