// What was typed and saved on this device until the server has it. One storage key per entry, so that two tabs never
// overwrite each other; an entry leaves only when the server answered for its id.
const fortnight = 14 * 24 * 3600 * 1000;

export function newId() {
  const bytes = crypto.getRandomValues(new Uint8Array(16));
  bytes[6] = (bytes[6] & 0x0f) | 0x40;
  bytes[8] = (bytes[8] & 0x3f) | 0x80;
  const hex = [...bytes].map(b => b.toString(16).padStart(2, "0")).join("");
  return hex.replace(/^(.{8})(.{4})(.{4})(.{4})(.{12})$/, "$1-$2-$3-$4-$5");
}

export class Outbox {
  constructor(board, store = localStorage) {
    this.store = store;
    this.prefix = `clubbench.outbox.${board}.`;
    this.counter = `clubbench.count.${board}`;
  }

  get entries() {
    return Object.keys(this.store).filter(k => k.startsWith(this.prefix)).sort().map(k => JSON.parse(this.store.getItem(k)));
  }

  add(entry) {
    const place = Number(this.store.getItem(this.counter) ?? 0) + 1;
    this.store.setItem(this.counter, String(place));
    const kept = { id: newId(), ...entry };
    this.store.setItem(`${this.prefix}${String(place).padStart(9, "0")}.${kept.id}`, JSON.stringify(kept));
    return kept;
  }

  remove(id) {
    for (const key of Object.keys(this.store)) if (key.startsWith(this.prefix) && key.endsWith(id)) this.store.removeItem(key);
  }
}

/** Text typed and not yet saved, kept on every keystroke. */
export class Drafts {
  constructor(board, store = localStorage) {
    this.store = store;
    this.prefix = `clubbench.draft.${board}.`;
    for (const key of Object.keys(store))
      if (key.startsWith("clubbench.draft.") && Date.now() - (JSON.parse(store.getItem(key)).at ?? 0) > fortnight) store.removeItem(key);
  }

  keep(field, value) {
    if (value.text === "") this.drop(field);
    else this.store.setItem(this.prefix + field, JSON.stringify({ ...value, at: Date.now() }));
  }

  of(field) { return JSON.parse(this.store.getItem(this.prefix + field) ?? "null"); }

  drop(field) { this.store.removeItem(this.prefix + field); }
}

/** Sends the outbox in order and tells how it stands: state is "saved", "sending", "waiting" or "signedOut". */
export class Sender {
  constructor(outbox, page, tell) {
    Object.assign(this, { outbox, page, tell, pause: 2000, timer: 0, busy: false });
    addEventListener("online", () => this.send());
    document.addEventListener("visibilitychange", () => { if (!document.hidden) this.send(); });
  }

  async send() {
    if (this.busy) return;
    const waiting = this.outbox.entries;
    if (waiting.length === 0) return;
    this.busy = true;
    clearTimeout(this.timer);
    try {
      const answer = await this.post(waiting);
      for (const item of answer.items) { this.outbox.remove(item.id); this.tell.answered(item, waiting.find(w => w.id === item.id)); }
      this.pause = 2000;
      this.busy = false;
      this.tell.state("saved");
      if (this.outbox.entries.length > 0) this.send();
    } catch (problem) {
      this.busy = false;
      this.tell.state(problem.signedOut ? "signedOut" : "waiting");
      this.timer = setTimeout(() => this.send(), this.pause);
      this.pause = Math.min(15000, this.pause * 2);
    }
  }

  async post(items, again = true) {
    const response = await fetch(this.page.entriesUrl, {
      method: "POST", credentials: "same-origin", signal: AbortSignal.timeout(5000),
      headers: { "Content-Type": "application/json", RequestVerificationToken: this.page.token },
      body: JSON.stringify({ items }),
    });
    if (response.ok) return response.json();
    if (response.status === 401 || response.status === 403) throw Object.assign(new Error("signed out"), { signedOut: true });
    if (response.status === 400 && again && await this.page.renewToken()) return this.post(items, false);
    throw new Error(`answer ${response.status}`);
  }
}
