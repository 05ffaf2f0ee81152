// What was typed stays with this window until the archive holds it: a cut wire, a killed server, a stopped database lose no key.
// A field says by data-known what the server knows of it; the page's head says by data-draft whether all the server knows is saved.
window.jointPlanner.typed = (() => {
  const place = () => location.pathname;
  const read = kind => JSON.parse(sessionStorage.getItem(`${kind}:${place()}`) ?? '{}');
  const write = (kind, entries) => {
    if (Object.keys(entries).length) sessionStorage.setItem(`${kind}:${place()}`, JSON.stringify(entries));
    else sessionStorage.removeItem(`${kind}:${place()}`);
  };
  const fieldOf = path => document.querySelector(`.field [data-path="${CSS.escape(path)}"]`);
  const note = event => {
    const field = event.target;
    if (!field.dataset?.path || !('value' in field)) return;
    write('typed', { ...read('typed'), [field.dataset.path]: field.value });
  };
  const forget = () => {
    if (!document.querySelector('[data-draft="saved"]')) return;
    const entries = read('typed');
    for (const path of Object.keys(entries)) {
      const field = fieldOf(path);
      if (!field || field.dataset.known === field.value) delete entries[path];
    }
    write('typed', entries);
  };
  document.addEventListener('input', note, true);
  document.addEventListener('change', note, true);
  setInterval(forget, 500);
  return {
    // What an earlier page at this address could not hand over, path by path; it stays until it is settled.
    left: () => {
      const entries = { ...read('left'), ...read('typed') };
      write('typed', {});
      write('left', entries);
      return Object.entries(entries).map(([path, text]) => ({ path, text }));
    },
    settle: () => { write('left', {}); write('typed', {}); },
    // The same circuit is back: hand over what was typed while it was away.
    resend: () => {
      for (const path of Object.keys(read('typed'))) {
        const field = fieldOf(path);
        if (field && field.dataset.known !== field.value) field.dispatchEvent(new Event(field.tagName === 'SELECT' ? 'change' : 'input', { bubbles: true }));
      }
    },
  };
})();

const wire = document.getElementById('components-reconnect-modal');
let waiting = 0;
// The circuit is gone for good: draft and typed entries come back with a new page, as soon as the server answers.
async function again() {
  clearTimeout(waiting);
  try {
    if ((await fetch('health', { cache: 'no-store' })).ok) { location.reload(); return; }
  } catch { /* still no answer */ }
  waiting = setTimeout(again, 3000);
}
wire.addEventListener('components-reconnect-state-changed', ({ detail }) => {
  if (detail.state === 'hide') window.jointPlanner.typed.resend();
  if (detail.state === 'failed' || detail.state === 'rejected') again();
});
