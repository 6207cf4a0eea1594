// One step on the screen at a time, by the address; ticks are kept on this device.
export function keepTicks(board) {
  for (const tick of document.querySelectorAll("input.tick")) {
    const key = `clubbench.tick.${board}.${tick.dataset.tick}`;
    tick.checked = localStorage.getItem(key) === "1";
    tick.addEventListener("change", () => localStorage.setItem(key, tick.checked ? "1" : "0"));
  }
}

export function oneStepAtATime(start) {
  const parts = [...document.querySelectorAll("[data-part]")];
  const show = () => {
    const wanted = decodeURIComponent(location.hash.slice(1));
    const part = parts.find(p => p.id === wanted) ?? parts.find(p => p.id === start) ?? parts[0];
    for (const p of parts) p.hidden = p !== part;
    document.querySelector("[data-where-stage]").textContent = part.dataset.stageName ?? "";
    document.querySelector("[data-where-step]").textContent = part.dataset.stepName ?? "";
    if (wanted !== "") { scrollTo(0, 0); part.querySelector("h1")?.focus({ preventScroll: true }); }
  };
  addEventListener("hashchange", show);
  show();
}
