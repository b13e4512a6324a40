// Shows beside a name what the page tells of it, copied from the line where it is set. Names are the links of the trace lists, and
// in formulas the symbols whose class is the place where they are set; without this script the lists' links lead there.
(() => {
  const NAME = 'math [class*="at-"]', OPENS_AFTER = 200, CLOSES_AFTER = 300, GAP = 6;
  let name, panel, timer, away = true, touched, before, quiet = false;

  const inPanel = node => panel?.contains(node);
  const placeOf = name => name.hash ? name.hash.slice(1) : [...name.classList].find(each => each.startsWith('at-'));
  const nameAt = node => {
    const symbol = node.closest('msub') ?? node.closest('mi');
    if (inPanel(node)) return null;
    return node.closest('.trace a') ?? (symbol?.matches(NAME) ? symbol : symbol?.querySelector(NAME)) ?? null;
  };
  const later = (act, wait) => { clearTimeout(timer); timer = setTimeout(act, wait); };
  const add = (tag, cssClass, ...parts) => {
    const added = panel.appendChild(document.createElement(tag));
    added.className = cssClass;
    parts.forEach(part => added.append(part.cloneNode?.(true) ?? part));
  };
  const focusName = () => { quiet = true; name.focus?.(); quiet = false; };

  function fill(address, byKey) {
    const line = address.closest('.line, tr');
    const first = (...selectors) => selectors.map(each => line.querySelector(each)).find(found => found?.textContent.trim());
    const symbol = first('.equation > .name math', '.equation > var', 'th summary', 'td summary')?.cloneNode(true);
    const value = first('td[data-label=Value] summary', 'td[data-label=Value]', '.result > summary');
    const meaning = first('.meaning', 'td.remark', 'figcaption'), trace = first('.trace');
    add('p', 'peek-head', address, ' ' + address.closest('.cell').querySelector('h3').childNodes[1].data.trim());
    add('p', 'peek-value', ...(symbol?.matches('summary') ? symbol.childNodes : [symbol ?? '']),
      symbol && value ? (line.className.startsWith('verdict') ? ': ' : ' = ') : '', value?.textContent.trim() ?? '');
    if (meaning) add('p', 'meaning', meaning.textContent);
    if (trace) panel.append(trace.cloneNode(true));
    if (byKey) add('p', 'peek-keys', 'Enter: to line ' + address.textContent + '. Arrow down: into this box. Escape: close.');
    panel.querySelectorAll('[id]').forEach(part => part.removeAttribute('id'));
  }

  function open(link, byKey) {
    const address = document.getElementById(placeOf(link)), symbol = link.closest('msub') ?? link;
    close();
    name = link;
    if (link.hash) name.setAttribute('aria-expanded', 'true');
    name.classList.add('peeked');
    panel = document.querySelector('main').appendChild(document.createElement('div'));
    panel.className = 'peek';
    panel.setAttribute('role', 'group');
    panel.setAttribute('aria-label', 'Trace of ' + symbol.textContent);
    fill(address, byKey);
    const page = document.documentElement, at = symbol.getBoundingClientRect(), size = panel.getBoundingClientRect();
    const above = at.bottom + GAP + size.height > page.clientHeight && at.top > GAP + size.height;
    panel.style.left = scrollX + Math.max(GAP, Math.min(at.left, page.clientWidth - size.width - GAP)) + 'px';
    panel.style.top = scrollY + (above ? at.top - GAP - size.height : at.bottom + GAP) + 'px';
  }

  function close() {
    clearTimeout(timer);
    if (inPanel(document.activeElement)) focusName();
    name?.removeAttribute('aria-expanded');
    name?.classList.remove('peeked');
    panel?.remove();
    name = panel = null;
  }

  document.addEventListener('pointerover', ({ pointerType, target }) => {
    const link = nameAt(target), focus = document.activeElement;
    if (pointerType === 'mouse' && (link || inPanel(target))) {
      away = false;
      later(() => link && link !== name && open(link), OPENS_AFTER);
    } else if (!away && focus !== name && !inPanel(focus)) {
      away = true;
      later(close, CLOSES_AFTER);
    }
  });
  document.addEventListener('pointerdown', ({ pointerType, target }) => {
    touched = pointerType !== 'mouse';
    before = name;
    if (!nameAt(target) && !inPanel(target)) close();
  });
  document.addEventListener('click', event => {
    const link = nameAt(event.target);
    if (link && touched && event.detail && link !== before) {
      // The first tap shows the panel, a second one goes there.
      event.preventDefault();
      open(link);
    } else if (link && !link.hash) {
      close();
      location.hash = placeOf(link);
    } else if (event.target.closest('a')) close();
  });
  document.addEventListener('focusin', ({ target }) => {
    const link = nameAt(target);
    if (link && !quiet && link.matches(':focus-visible')) open(link, true);
    else if (!link && !inPanel(target)) close();
  });
  document.addEventListener('keydown', event => {
    const links = [...panel?.querySelectorAll('a') ?? []], focus = document.activeElement;
    if (event.key === 'Escape') close();
    if (!panel) return;
    if (event.key === 'ArrowDown' && focus === name) {
      event.preventDefault();
      links[0].focus();
    } else if (event.key === 'Tab' && focus === links.at(event.shiftKey ? 0 : -1)) {
      // Out of the panel at its ends: to the name, or on from there.
      if (event.shiftKey) event.preventDefault();
      focusName();
    }
  });
  addEventListener('resize', close);
})();
