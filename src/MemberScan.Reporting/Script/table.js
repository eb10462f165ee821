// The table of all candidates: filters, sorting, columns, rows drawn only where they are seen, one selection for the whole page.
'use strict';

(() => {
  const filterIds = ['role', 'section', 'material', 'storey', 'situation', 'criterion', 'reason'];
  const searched = ['name', 'tag', 'key', 'class', 'section', 'material', 'storey', 'situation', 'role', 'reason', 'reasonText', 'notes'];
  const rowsAround = 6;
  const formulaStarts = '=+-@\t\r\n＝＋－＠';

  /**
   * @template {HTMLElement} T
   * @param {string} id
   * @returns {T}
   */
  function part(id) {
    return /** @type {T} */ (document.getElementById(id));
  }

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
   * One field of the CSV file (RFC 4180); a text that a spreadsheet would take for a formula gets an apostrophe in front.
   * @param {string | number} value
   */
  function field(value) {
    if (typeof value === 'number') return String(value);
    const guarded = value && formulaStarts.includes(value[0]) ? "'" + value : value;
    return /[,"\r\n]/.test(guarded) ? `"${guarded.replaceAll('"', '""')}"` : guarded;
  }

  memberScan.startTable = (data) => {
    const { columns, figures, words } = memberScan;
    const grid = part('table-grid');
    const head = part('table-head');
    const rows = part('table-rows');
    const search = /** @type {HTMLInputElement} */ (part('filter-text'));
    const narrow = matchMedia('(max-width: 46rem)');
    const verdict = data.byte('verdict');
    const boxes = [...document.querySelectorAll('[name="filter-verdict"]')].map((box) => /** @type {HTMLInputElement} */ (box));
    /** @type {Map<string, HTMLSelectElement>} */
    const selects = new Map(filterIds.map((id) => [id, /** @type {HTMLSelectElement} */ (part('filter-' + id))]));

    let shown = new Uint32Array(0);
    let active = 0;
    let rowHeight = 0;
    let sortBy = 'utilization';
    let isRising = false;
    /** @type {Map<string, ArrayLike<number>>} */
    const keys = new Map();
    /** @type {string[] | undefined} */
    let haystack;

    function fillFilters() {
      for (const [id, select] of selects) {
        /** @type {Map<number, number>} */
        const counts = new Map();
        for (const number of data.text(id)) counts.set(number, (counts.get(number) ?? 0) + 1);
        const values = [...counts].filter(([number]) => number > 0).sort((a, b) => (data.texts[a[0]] < data.texts[b[0]] ? -1 : 1));
        select.append(new Option('any', ''));
        for (const [number, count] of values) select.append(new Option(`${data.texts[number]} (${figures.count(count)})`, 'is ' + data.texts[number]));
        if (counts.has(0) && values.length > 0) select.append(new Option(`none given (${figures.count(counts.get(0) ?? 0)})`, 'is '));
        select.disabled = values.length === 0;
      }
    }

    function haystacks() {
      if (haystack) return haystack;
      const lower = data.texts.map((text) => text.toLowerCase());
      const parts = searched.map((id) => data.text(id));
      haystack = Array.from({ length: data.count }, (_, index) => parts.map((part) => lower[part[index]]).join('\n'));
      return haystack;
    }

    /** @param {string} id */
    function keysOf(id) {
      let found = keys.get(id);
      if (!found) {
        const column = columns.find((c) => c.id === id);
        if (!column) throw new Error(`There is no column '${id}'.`);
        keys.set(id, found = column.keys(data));
      }
      return found;
    }

    function refresh() {
      const wanted = [...selects].filter(([, select]) => select.value).map(([id, select]) => /** @type {[Uint32Array, number]} */ ([data.text(id), data.texts.indexOf(select.value.slice(3))]));
      const verdicts = boxes.map((box) => box.checked);
      const terms = search.value.toLowerCase().split(/\s+/).filter((term) => term);
      const text = terms.length > 0 ? haystacks() : [];
      const found = [];
      for (let i = 0; i < data.count; i++) {
        if (!verdicts[verdict[i]]) continue;
        if (wanted.some(([column, number]) => column[i] !== number)) continue;
        if (terms.length > 0 && !terms.every((term) => text[i].includes(term))) continue;
        found.push(i);
      }

      const by = keysOf(sortBy);
      const turn = isRising ? 1 : -1;
      shown = Uint32Array.from(found).sort((a, b) => {
        const [x, y] = [by[a], by[b]];
        if (x === y) return a - b;
        if (Number.isNaN(x)) return Number.isNaN(y) ? a - b : 1;
        return Number.isNaN(y) ? -1 : turn * (x - y);
      });
      const place = shown.indexOf(memberScan.selected);
      active = place >= 0 ? place : 0;
      tellCount();
      layOut();
      memberScan.tell('filter');
    }

    function tellCount() {
      const counts = [0, 0, 0];
      for (const index of shown) counts[verdict[index]]++;
      part('table-count').textContent =
        `${figures.count(shown.length)} of ${figures.count(data.count)} candidates: ${figures.count(counts[1])} overstressed, ${figures.count(counts[2])} not checked, ${figures.count(counts[0])} within limit.`;
    }

    const shownColumns = () => (narrow.matches ? columns.filter((c) => ['verdict', 'utilization', 'name', 'section'].includes(c.id)) : columns.filter((c) => c.isShown));

    function layOut() {
      const visible = shownColumns();
      grid.classList.toggle('cards', narrow.matches);
      grid.setAttribute('aria-rowcount', String(shown.length + 1));
      grid.setAttribute('aria-colcount', String(visible.length));
      grid.style.setProperty('--columns', visible.map((c) => `minmax(${c.width}em, ${c.width}fr)`).join(' '));
      grid.style.setProperty('--total', `${visible.reduce((sum, c) => sum + c.width, 0)}em`);
      head.replaceChildren(...visible.map(heading));
      rowHeight = 0;
      rows.replaceChildren();
      draw();
    }

    /** @param {TableColumn} column */
    function heading(column) {
      const cell = element('div', column.isNumber ? 'n' : '');
      const button = element('button', '', memberScan.titleOf(column, data));
      const isSorted = column.id === sortBy;
      cell.setAttribute('role', 'columnheader');
      cell.setAttribute('aria-sort', isSorted ? (isRising ? 'ascending' : 'descending') : 'none');
      if (isSorted) button.append(element('span', 'sorted', isRising ? ' ↑' : ' ↓'));
      button.setAttribute('type', 'button');
      button.dataset.sort = column.id;
      cell.append(button);
      return cell;
    }

    function measure() {
      const probe = row(0, 0, shownColumns());
      rows.append(probe);
      rowHeight = Math.max(16, probe.getBoundingClientRect().height);
      probe.remove();
    }

    // Only the rows in sight and a few around them are in the document.
    function draw() {
      if (shown.length === 0) {
        rows.style.height = '0';
        rows.replaceChildren();
        grid.removeAttribute('aria-activedescendant');
        part('table-none').hidden = false;
        return;
      }

      part('table-none').hidden = true;
      if (rowHeight === 0) measure();
      rows.style.height = `${rowHeight * shown.length}px`;
      const first = Math.max(0, Math.floor(grid.scrollTop / rowHeight) - rowsAround);
      const last = Math.min(shown.length, Math.ceil((grid.scrollTop + grid.clientHeight) / rowHeight) + rowsAround);
      const visible = shownColumns();
      const made = [];
      for (let place = first; place < last; place++) made.push(row(place, place * rowHeight, visible));
      if (active < first || active >= last) made.push(row(active, active * rowHeight, visible));
      rows.replaceChildren(...made);
      grid.setAttribute('aria-activedescendant', 'row-' + shown[active]);
    }

    /**
     * @param {number} place
     * @param {number} top
     * @param {TableColumn[]} visible
     */
    function row(place, top, visible) {
      const index = shown[place];
      const made = element('div', 'row' + (place === active ? ' active' : '') + (index === memberScan.selected ? ' selected' : ''));
      made.id = 'row-' + index;
      made.setAttribute('role', 'row');
      made.setAttribute('aria-rowindex', String(place + 2));
      made.setAttribute('aria-selected', String(index === memberScan.selected));
      made.dataset.place = String(place);
      made.style.transform = `translateY(${top}px)`;
      visible.forEach((column, number) => {
        const text = column.show(data, index);
        const cell = element('div', (column.isNumber ? 'n' : '') + (column.id === 'verdict' ? ' verdict ' + words.styles[verdict[index]] : ''));
        cell.setAttribute('role', 'gridcell');
        cell.setAttribute('aria-colindex', String(number + 1));
        if (column.isNumber) cell.textContent = text;
        else cell.append(element('bdi', '', text));
        if (text.length > 12) cell.title = text;
        made.append(cell);
      });
      return made;
    }

    /** @param {number} place */
    function activate(place) {
      active = Math.min(Math.max(place, 0), Math.max(shown.length - 1, 0));
      const [top, headHeight] = [active * rowHeight, head.offsetHeight];
      if (top < grid.scrollTop) grid.scrollTop = top;
      else if (top + rowHeight > grid.scrollTop + grid.clientHeight - headHeight) grid.scrollTop = top + rowHeight - grid.clientHeight + headHeight;
      draw();
    }

    /** @param {KeyboardEvent} event */
    function key(event) {
      if (event.target instanceof HTMLButtonElement || event.altKey || event.metaKey) return;
      const page = Math.max(1, Math.floor((grid.clientHeight - head.offsetHeight) / Math.max(rowHeight, 1)) - 1);
      /** @type {Record<string, () => void>} */
      const moves = {
        ArrowDown: () => activate(active + 1),
        ArrowUp: () => activate(active - 1),
        PageDown: () => activate(active + page),
        PageUp: () => activate(active - page),
        Home: () => activate(0),
        End: () => activate(shown.length - 1),
        Enter: () => memberScan.select(shown[active] ?? -1),
        ' ': () => memberScan.select(shown[active] ?? -1),
        Escape: () => memberScan.select(-1),
      };
      const move = moves[event.key];
      if (event.ctrlKey && event.key === 'c' && String(getSelection()) === '') void copy();
      else if (!move || event.ctrlKey) return;
      else move();
      event.preventDefault();
    }

    function csv() {
      const visible = columns.filter((c) => c.isShown || c.id === 'key');
      const lines = [visible.map((c) => field(memberScan.titleOf(c, data))).join(',')];
      for (const index of shown) lines.push(visible.map((c) => field(c.value(data, index))).join(','));
      return lines.join('\r\n') + '\r\n';
    }

    async function copy() {
      const text = csv();
      try {
        await navigator.clipboard.writeText(text);
        part('table-told').textContent = `${figures.count(shown.length)} rows copied.`;
      } catch {
        part('table-told').textContent = 'The browser did not allow copying; save the rows as CSV instead.';
      }
    }

    function save() {
      const link = document.createElement('a');
      link.href = URL.createObjectURL(new Blob([csv()], { type: 'text/csv' }));
      link.download = data.file.replace(/\.[^.]*$/, '').replace(/[^\p{L}\p{N}._-]+/gu, '_') + '.filtered.csv';
      link.click();
      setTimeout(() => URL.revokeObjectURL(link.href), 10_000);
      part('table-told').textContent = `${figures.count(shown.length)} rows saved as ${link.download}.`;
    }

    function reset() {
      for (const box of boxes) box.checked = true;
      for (const select of selects.values()) select.value = '';
      search.value = '';
      refresh();
    }

    function fillColumns() {
      part('table-columns').replaceChildren(...columns.map((column) => {
        const label = element('label');
        const box = document.createElement('input');
        box.type = 'checkbox';
        box.checked = column.isShown;
        box.addEventListener('change', () => {
          column.isShown = box.checked;
          layOut();
        });
        label.append(box, ' ' + memberScan.titleOf(column, data));
        return label;
      }));
    }

    /** @param {Record<string, string>} values */
    function filter(values) {
      if (values.verdict !== undefined) boxes.forEach((box, i) => { box.checked = words.verdicts[i] === values.verdict; });
      if (values.text !== undefined) search.value = values.text;
      for (const [id, value] of Object.entries(values)) if (selects.has(id)) /** @type {HTMLSelectElement} */ (selects.get(id)).value = 'is ' + value;
      refresh();
    }

    fillFilters();
    fillColumns();
    refresh();
    for (const control of [...boxes, ...selects.values()]) control.addEventListener('change', refresh);
    search.addEventListener('input', refresh);
    part('filter-reset').addEventListener('click', reset);
    part('table-copy').addEventListener('click', () => void copy());
    part('table-save').addEventListener('click', save);
    grid.addEventListener('scroll', () => draw(), { passive: true });
    grid.addEventListener('keydown', key);
    narrow.addEventListener('change', layOut);
    addEventListener('resize', () => draw());
    head.addEventListener('click', (event) => {
      const button = event.target instanceof Element ? event.target.closest('button') : null;
      if (!button?.dataset.sort) return;
      isRising = button.dataset.sort === sortBy ? !isRising : !columns.find((c) => c.id === button.dataset.sort)?.isNumber;
      sortBy = button.dataset.sort;
      refresh();
      /** @type {HTMLElement | null} */ (head.querySelector(`[data-sort="${sortBy}"]`))?.focus();
    });
    rows.addEventListener('click', (event) => {
      const hit = event.target instanceof Element ? event.target.closest('.row') : null;
      if (!(hit instanceof HTMLElement)) return;
      active = Number(hit.dataset.place);
      memberScan.select(shown[active]);
      grid.focus({ preventScroll: true });
    });
    for (const button of document.querySelectorAll('[data-filter-verdict]'))
      button.addEventListener('click', () => {
        filter({ verdict: /** @type {HTMLElement} */ (button).dataset.filterVerdict ?? '' });
        part('members').scrollIntoView();
        grid.focus({ preventScroll: true });
      });
    memberScan.on('select', () => {
      const place = shown.indexOf(memberScan.selected);
      if (place < 0) return draw();
      const isSeen = place * rowHeight >= grid.scrollTop && (place + 1) * rowHeight <= grid.scrollTop + grid.clientHeight - head.offsetHeight;
      if (!isSeen) grid.scrollTop = (place + 0.5) * rowHeight - (grid.clientHeight - head.offsetHeight) / 2;
      activate(place);
    });

    return {
      get shown() { return shown; },
      select: (index) => memberScan.select(index),
      filter,
      csv,
    };
  };
})();
