// The little that the server cannot do: remember two choices in this browser, say its time zone, hand out a file or a copy, and lead from a drawn thing or a fault to its place.
let came = null;
window.jointPlanner = {
  save: (name, kind, text) => {
    const link = document.createElement('a');
    link.href = URL.createObjectURL(new Blob([text], { type: kind }));
    link.download = name;
    link.click();
    setTimeout(() => URL.revokeObjectURL(link.href), 10000);
  },
  copy: async text => {
    try { await navigator.clipboard.writeText(text); return true; } catch { return false; }
  },
  remember: (name, value) => { document.cookie = `${name}=${value}; Path=/; Max-Age=31536000; SameSite=Lax`; },
  zone: () => Intl.DateTimeFormat().resolvedOptions().timeZone ?? '',
  enter: selector => { came = document.activeElement; document.querySelector(selector)?.focus({ preventScroll: true }); },
  back: () => { if (came?.isConnected) came.focus({ preventScroll: true }); },
  focus: selector => document.querySelector(selector)?.focus(),
  paper: value => { document.documentElement.dataset.theme = value; window.jointPlanner.remember('paper', value); },
};
function follow(drawn) {
  const column = document.querySelector(`[data-column="${CSS.escape(drawn.dataset.path)}"]`);
  if (!column) return;
  column.scrollIntoView({ block: 'nearest', inline: 'center' });
  (column.querySelector('input, button, a') ?? column).focus();
}
function lead(path) {
  const named = [path, path.slice(0, path.lastIndexOf('/'))].flatMap(p => [`[data-path="${CSS.escape(p)}"]:is(input, select, textarea)`, `[data-fault="${CSS.escape(p)}"]:not(li)`, `[data-column="${CSS.escape(p)}"]`]);
  const place = named.map(n => document.querySelector(n)).find(p => p);
  if (!place) return;
  for (let around = place.parentElement; around; around = around.parentElement) if (around.tagName === 'DETAILS') around.open = true;
  place.scrollIntoView({ block: 'center', inline: 'center' });
  if (place.tabIndex < 0) place.tabIndex = -1;
  place.focus();
}
document.addEventListener('click', event => {
  const led = event.target.closest?.('[data-leads]');
  if (led) { lead(led.dataset.leads); return; }
  const drawn = event.target.closest?.('.picture [data-path]');
  if (drawn) follow(drawn);
  // The router scrolls to the content and leaves the focus where it was.
  if (event.target.closest?.('.skip')) document.getElementById('content').focus();
});
// Esc folds what is open round the focus, else the open derivation, and leads back to what opened it.
function fold(at) {
  const round = at.closest?.('.person[open], .more[open]');
  if (round) { round.open = false; round.querySelector('summary').focus(); return true; }
  const button = document.querySelector('[data-act="fold"]');
  button?.click();
  return button !== null;
}
document.addEventListener('keydown', event => {
  if (event.key === 'Escape' && fold(event.target)) { event.preventDefault(); return; }
  const drawn = (event.key === 'Enter' || event.key === ' ') && event.target.closest?.('.picture [data-path]');
  if (drawn) { event.preventDefault(); follow(drawn); return; }
  if (!(event.ctrlKey || event.metaKey) || event.altKey) return;
  const key = event.key.toLowerCase();
  const act = key === 'z' && !event.shiftKey ? 'undo' : key === 'y' || key === 'z' ? 'redo' : '';
  const button = act && document.querySelector(`[data-act="${act}"]`);
  if (!button) return;
  // The page's own undo covers typing too; the browser's would fall out of step with it.
  event.preventDefault();
  button.click();
});
// The password once more: a plain request, so that its answer can set the cookie; the page and what stands on it stay.
document.addEventListener('submit', async event => {
  const form = event.target.closest?.('form[data-again]');
  if (!form) return;
  event.preventDefault();
  const answer = form.querySelector('[data-answer]');
  const button = form.querySelector('button[type=submit]');
  button.disabled = true;
  try {
    const response = await fetch(form.action, { method: 'POST', body: new FormData(form), redirect: 'error' });
    const says = await response.text();
    answer.value = response.ok ? `+${says}` : response.status === 429 ? '-Too many tries from this address. Wait a minute, then type it again.'
      : says.length < 300 && !says.startsWith('<') ? `-${says}` : '-The server did not take it. Load the page again if it stays so.';
  } catch {
    answer.value = '-There was no answer. Look whether you are still connected and signed in, then type it again.';
  }
  form.querySelector('[type=password]').value = '';
  button.disabled = false;
  answer.dispatchEvent(new Event('change', { bubbles: true }));
});
// A file that its form does not take is told before it is sent.
document.addEventListener('change', event => {
  const most = Number(event.target.dataset?.most);
  if (!most) return;
  const large = [...event.target.files].find(file => file.size > most);
  event.target.setCustomValidity(large ? `${large.name} is larger than ${event.target.dataset.mostSaid}. Choose another file.` : '');
});
