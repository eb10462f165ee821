// What the scripts of the page share. Nothing is computed here but the text of numbers; every value is that of the run record.
'use strict';

(() => {
  /** @type {Map<string, (() => void)[]>} */
  const listeners = new Map();

  globalThis.memberScan = /** @type {MemberScan} */ ({
    selected: -1,
    ownsRows: true,
    columns: /** @type {TableColumn[]} */ ([]),
    words: {
      verdicts: ['WITHIN LIMIT', 'OVERSTRESSED', 'NOT CHECKED'],
      symbols: ['●', '▲', '◇'],
      styles: ['within', 'over', 'open'],
    },
    on(event, listener) {
      const all = listeners.get(event) ?? [];
      all.push(listener);
      listeners.set(event, all);
    },
    tell(event) {
      for (const listener of listeners.get(event) ?? []) listener();
    },
    indexOf(key) {
      const data = memberScan.data;
      if (!data) return -1;
      const wanted = data.texts.indexOf(key);
      return wanted < 0 ? -1 : data.text('key').indexOf(wanted);
    },
    select(index) {
      if (index === memberScan.selected) return;
      memberScan.selected = index;
      const key = index < 0 || !memberScan.data ? '' : memberScan.data.textOf('key', index);
      history.replaceState(null, '', key ? '#member=' + encodeURIComponent(key) : location.pathname + location.search);
      memberScan.tell('select');
    },
  });
})();
