// Light or dark sheet: the person's choice is kept in a cookie, so the server draws the right one at once.
(() => {
  const root = document.documentElement;
  const isDark = () => root.dataset.sheet
    ? root.dataset.sheet === "dark"
    : window.matchMedia("(prefers-color-scheme: dark)").matches;
  document.addEventListener("click", event => {
    if (!event.target.closest("[data-sheet-switch]")) return;
    root.dataset.sheet = isDark() ? "light" : "dark";
    document.cookie = `sheet=${root.dataset.sheet}; path=/; max-age=31536000; samesite=lax`;
  });
})();
