// What is known of the selected candidate, beside the table.
'use strict';

(() => {
  /**
   * @param {string} tag
   * @param {string} style
   * @param {string} text
   */
  function element(tag, style = '', text = '') {
    const made = document.createElement(tag);
    if (style) made.className = style;
    if (text) made.textContent = text;
    return made;
  }

  /**
   * @param {HTMLElement} list
   * @param {string} term
   * @param {string} text
   * @param {boolean} isWide
   */
  function fact(list, term, text, isWide = false) {
    if (!text) return;
    const pair = element('div', isWide ? 'wide' : '');
    const value = element('dd');
    value.append(element('bdi', '', text));
    pair.append(element('dt', '', term), value);
    list.append(pair);
  }

  memberScan.startPanel = (data) => {
    const { figures, words } = memberScan;
    const panel = /** @type {HTMLElement} */ (document.getElementById('table-panel'));

    /**
     * @param {string} id
     * @param {number} index
     */
    function shown(id, index) {
      const column = memberScan.columns.find((c) => c.id === id);
      const text = column ? column.show(data, index) : '';
      const unit = column && memberScan.titleOf(column, data).split(' [')[1];
      return text && unit ? `${text}\u00A0${unit.slice(0, -1)}` : text;
    }

    /** @param {number} index */
    function heading(index) {
      const verdict = data.byte('verdict')[index];
      const title = element('h3');
      const name = element('bdi', '', data.textOf('name', index));
      const outcome = element('p', 'verdict ' + words.styles[verdict], `${words.symbols[verdict]} ${words.verdicts[verdict]} ${shown('utilization', index)}`);
      title.id = 'panel-title';
      title.append(name);
      return [title, outcome];
    }

    /** @param {number} index */
    function facts(index) {
      const list = element('dl', 'facts');
      const text = (/** @type {string} */ id) => data.textOf(id, index);
      fact(list, 'Key', text('key'));
      fact(list, 'Tag', text('tag'));
      fact(list, 'Class, role', [text('class'), text('role')].filter((t) => t).join(', '));
      fact(list, 'Storey', text('storey'));
      fact(list, 'Section', text('section'), true);
      fact(list, 'Material', text('material'));
      fact(list, 'Yield strength', shown('strength', index));
      fact(list, 'Length', shown('length', index));
      if (text('reason')) {
        fact(list, 'Not checked because', `${text('reason')}: ${text('reasonText')}`, true);
        fact(list, 'To the modeler', text('request'), true);
      }
      if (!Number.isNaN(data.number('utilization')[index])) governing(list, index);
      fact(list, 'Notes', text('notes'), true);
      fact(list, 'Decision', text('decision'), true);
      return list;
    }

    /**
     * @param {HTMLElement} list
     * @param {number} index
     */
    function governing(list, index) {
      const text = (/** @type {string} */ id) => data.textOf(id, index);
      fact(list, 'Situation', `${text('situation')} (${text('kind')})`, true);
      fact(list, 'Station from the start', shown('station', index));
      fact(list, 'Place on the section', text('place'));
      fact(list, 'Stress against limit', `${shown('stress', index)} against ${shown('limit', index)}`);
      fact(list, 'Point from the centroid', `y = ${shown('y', index)}, z = ${shown('z', index)}`);
      fact(list, 'Criterion', text('criterion'), true);
      fact(list, 'Section forces', ['N', 'Vy', 'Vz', 'T', 'My', 'Mz'].map((id) => `${id} ${shown(id, index)}`).join('; '), true);
      fact(list, 'Source of forces', text('forcesSource'), true);
    }

    // The full sheet stands in the page for overstressed members; for others it is drawn on demand, where a drawing is embedded.
    /** @param {number} index */
    function sheet(index) {
      const anchor = data.textOf('anchor', index);
      if (anchor) {
        const line = element('p');
        const link = /** @type {HTMLAnchorElement} */ (element('a', 'toSheet', 'Open the full sheet'));
        link.href = '#' + encodeURIComponent(anchor);
        line.append(link);
        return line;
      }

      const place = element('div', 'drawnSheet');
      memberScan.showSheet?.(place, data.textOf('key', index)).then((has) => {
        if (!has && data.textOf('situation', index)) place.textContent = 'The page holds no sheet of this member; its numbers stand above and in the run record.';
      });
      return place;
    }

    function draw() {
      const index = memberScan.selected;
      panel.hidden = index < 0;
      if (index < 0) return panel.replaceChildren();

      const close = element('button', 'close', 'Close');
      close.setAttribute('type', 'button');
      close.addEventListener('click', () => {
        memberScan.select(-1);
        document.getElementById('table-grid')?.focus({ preventScroll: true });
      });
      panel.replaceChildren(close, ...heading(index), facts(index), sheet(index));
      panel.scrollTop = 0;
      const told = document.getElementById('table-told');
      if (told) told.textContent = `Selected: ${data.textOf('name', index)}, ${words.verdicts[data.byte('verdict')[index]]} ${figures.utilization(data.number('utilization')[index] || 0)}`.replace(/ 0\.000$/, '');
    }

    memberScan.on('select', draw);
    draw();
  };
})();
