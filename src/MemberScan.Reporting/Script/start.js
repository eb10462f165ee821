// Starts the page: data, table, panel, view in space, the link to one member. Where anything of it fails, the plain lists are shown instead.
'use strict';

(() => {
  /** @param {string} id */
  const part = (id) => /** @type {HTMLElement} */ (document.getElementById(id));

  // With script on, a browser keeps the plain lists as text: this puts them into the page.
  function showPlainLists() {
    for (const plain of document.querySelectorAll('noscript')) {
      const place = document.createElement('div');
      place.innerHTML = plain.textContent ?? '';
      plain.replaceWith(place);
    }
  }

  /** @param {unknown} error */
  function fail(error) {
    part('members').hidden = true;
    showPlainLists();
    const note = part('script-note');
    note.hidden = false;
    note.textContent = `The table could not be built (${error instanceof Error ? error.message : String(error)}). All candidates stand in the plain lists below.`;
    const anchor = location.hash.slice(1);
    if (anchor) document.getElementById(decodeURIComponent(anchor))?.scrollIntoView();
  }

  function openLink() {
    const link = location.hash;
    if (!link.startsWith('#member=')) return followPlainLink(decodeURIComponent(link.slice(1)));

    const key = decodeURIComponent(link.slice('#member='.length));
    const index = memberScan.indexOf(key);
    const note = part('script-note');
    note.hidden = index >= 0;
    note.textContent = index >= 0 ? '' : `No candidate of this report has the key ${key}.`;
    if (index < 0) return;

    if (memberScan.table && !memberScan.table.shown.includes(index)) part('filter-reset').click();
    memberScan.selected = -1;
    memberScan.select(index);
    part('members').scrollIntoView();
  }

  // Links of the plain lists lead to rows that script leaves out: they select the member instead.
  /** @param {string} anchor */
  function followPlainLink(anchor) {
    if (!anchor.startsWith('member-') || document.getElementById(anchor)) return;
    const data = memberScan.data;
    const row = [...document.querySelectorAll('a[data-key]')].find((link) => link.getAttribute('href') === '#' + anchor);
    const key = row?.getAttribute('data-key') ?? anchor.slice('member-'.length).replace('-', '/');
    const index = data ? memberScan.indexOf(key) : -1;
    if (index < 0) return;
    memberScan.select(index);
    part('members').scrollIntoView();
  }

  /** @param {MemberData} data */
  function startView(data) {
    const container = part('space');
    const note = part('space-note');
    if (!memberScan.startView) {
      note.textContent = 'The view in space was left out of this report: the program was built without Node.js. The elevation stands in its place.';
      return;
    }

    try {
      memberScan.view = memberScan.startView(container, data);
    } catch (error) {
      console.info('The view in space cannot run here:', error);
    }

    if (memberScan.view) note.remove();
    else {
      container.remove();
      note.textContent = 'The view in space needs WebGL 2, which this browser does not give. The elevation stands in its place.';
    }
  }

  async function start() {
    try {
      const data = await memberScan.readBlock(part('members-data').textContent ?? '');
      memberScan.data = data;
      part('members').hidden = false;
      document.documentElement.classList.add('scripted');
      memberScan.table = memberScan.startTable(data);
      memberScan.startPanel(data);
      openLink();
      addEventListener('hashchange', openLink);
      performance.mark('members-ready');
    } catch (error) {
      fail(error);
      return;
    }

    // The table first: the view in space takes its time.
    await new Promise((resolve) => setTimeout(resolve));
    startView(memberScan.data);
    performance.mark('page-ready');
  }

  // Behind this script stands the view in space; it is there once the page is read to its end.
  memberScan.ready = new Promise((resolve) => {
    const run = () => resolve(start());
    if (document.readyState === 'loading') document.addEventListener('DOMContentLoaded', run);
    else run();
  });
})();
