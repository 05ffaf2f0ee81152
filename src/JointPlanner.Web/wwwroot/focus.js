// A page that draws itself again must not throw the keyboard back to its top: where the focused thing is gone, the heading round it takes over.
let round = [];
document.addEventListener('focusin', event => {
  round = [];
  for (let part = event.target; part && part !== document.body; part = part.parentElement) round.push(part);
});
document.addEventListener('focusout', event => queueMicrotask(() => {
  if (!event.relatedTarget && event.target.isConnected && !event.target.disabled) round = [];
}));
new MutationObserver(() => {
  if (document.activeElement !== document.body || !round.length) return;
  if (round[0].isConnected) { round[0].focus({ preventScroll: true }); return; }
  const left = round.find(part => part.isConnected);
  const heading = left?.querySelector('h1, h2, h3') ?? left;
  if (!heading) return;
  if (!heading.hasAttribute('tabindex')) heading.tabIndex = -1;
  heading.focus({ preventScroll: true });
}).observe(document.body, { subtree: true, childList: true, attributes: true, attributeFilter: ['disabled'] });
