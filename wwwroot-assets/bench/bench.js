// The builder's page of one board. Everything works without the network; what is saved waits in the outbox.
import { readEntry, inUnit, judge } from "./entry.js";
import { Outbox, Drafts, Sender } from "./outbox.js";
import { keepTicks, oneStepAtATime } from "./steps.js";

const page = JSON.parse(document.getElementById("bench").textContent);
const say = (key, values = {}) => page.texts[key].replace(/\{(\w+)\}/g, (_, name) => values[name] ?? "");
const outbox = new Outbox(page.board);
const drafts = new Drafts(page.board);
const pointOf = new Map(page.points.map(p => [p.point, p]));
let reached = true;

page.renewToken = async () => {
  const response = await fetch(page.changesUrl, { credentials: "same-origin" });
  if (!response.ok) return false;
  page.token = (await response.json()).token;
  return true;
};

// ---- connection and outbox, in words ----
const sync = document.getElementById("sync");
function showSync(state) {
  const count = outbox.entries.length;
  const clock = new Date().toLocaleTimeString([], { hour: "2-digit", minute: "2-digit", hour12: false });
  const key = state === "signedOut" ? "signedOut" : count === 1 ? "oneWaits" : count > 1 ? "someWait" : reached ? state : "away";
  sync.dataset.state = count > 0 || !reached ? "waiting" : state;
  sync.querySelector("[data-words]").innerHTML = "";
  const [head, ...tail] = say(key, { count, clock }).split("|");
  const strong = document.createElement("b");
  strong.textContent = head;
  sync.querySelector("[data-words]").append(strong, tail.join(""));
  document.querySelectorAll("[data-sign-in]").forEach(e => { e.hidden = state !== "signedOut"; });
}

const sender = new Sender(outbox, page, {
  state(state) { reached = state === "saved"; showSync(state); document.body.dataset.net = reached ? "up" : "down"; },
  answered(item, sent) { if (sent.type === "reading") showAnswer(item, sent); else showPlainAnswer(item, sent); },
});

function put(entry) {
  const kept = outbox.add(entry);
  showSync("sending");
  sender.send();
  return kept;
}

// ---- readings ----
const forms = new Map([...document.querySelectorAll("form.entry")].map(f => [f.dataset.point, f]));
const unitOf = (form, point) => point.units[Number(form.querySelector("[name^=unit]:checked")?.value ?? 0)];
const instrumentOf = (form, point) => point.instruments.find(i => i.name === form.elements.instrument.value) ?? null;

function showWindow(form, point) {
  const meter = instrumentOf(form, point), box = form.querySelector("[data-expect]");
  if (!box || point.low === null) return;
  const unit = unitOf(form, point), offset = meter?.offset ?? 0;
  const low = inUnit(point.low + offset, { ...unit, text: "" }, point.digits), high = inUnit(point.high + offset, unit, point.digits);
  box.querySelector("[data-head]").textContent = meter ? say("shouldShow", { meter: meter.name }) : say("shouldRead", { label: point.label });
  box.querySelector("[data-window]").textContent =
    point.sides === "AtLeast" ? say("atLeast", { low: inUnit(point.low + offset, unit, point.digits) })
      : point.sides === "AtMost" ? say("atMost", { high }) : say("window", { low, high });
  box.querySelector("[data-own]").textContent = offset === 0 ? say("itself", { label: point.label, nominal: inUnit(point.nominal, unit, point.digits) })
    : say("itselfAndMeter", { label: point.label, nominal: inUnit(point.nominal, unit, point.digits), meter: meter.name, offset: inUnit(offset, unit, 2) });
  form.querySelector("[data-label]").textContent = meter ? say("onMeter", { label: point.label, meter: meter.name }) : point.label;
}

function readForm(form, point) {
  const unit = unitOf(form, point), read = readEntry(form.elements.text.value, point, unit);
  return { unit, read, meter: instrumentOf(form, point) };
}

function problemWords(read, point) {
  if (read.problem === "twoMarks") return say("twoMarks", read.better);
  if (read.problem === "notThis") return say("notThis", { units: point.units.map(u => u.text).join(", ") });
  return say(read.problem);
}

function echo(form, point) {
  const out = form.querySelector("output"), { unit, read, meter } = readForm(form, point);
  if (read.problem) { out.textContent = read.problem === "empty" ? "" : problemWords(read, point); return; }
  const digits = Math.max(3, read.digits), value = read.si - (meter?.offset ?? 0), first = point.units[0];
  const other = unit !== first ? ` (${inUnit(read.si, unit, digits)})` : "";
  const off = point.nominal ? 100 * (value / point.nominal - 1) : 0;
  const key = !meter?.offset ? "readAs" : point.relative ? "readAsSoOff" : "readAsSo";
  out.textContent = say(key, { value: inUnit(read.si, first, digits) + other, label: point.label, own: inUnit(value, first, digits),
    off: Math.abs(off).toFixed(1), side: say(off < 0 ? "low" : "high") });
}

function phase(form, name) { form.dataset.phase = name; }

function advise(form, verdict, words, more = []) {
  const box = form.querySelector("[data-advice]");
  box.dataset.verdict = verdict;
  box.replaceChildren();
  box.hidden = words === "";
  const head = document.createElement("strong");
  head.textContent = words;
  box.append(head);
  if (more.length > 0) {
    const list = document.createElement(more.length > 1 ? "ol" : "p");
    for (const line of more) {
      const item = more.length > 1 ? list.appendChild(document.createElement("li")) : list;
      item.textContent = line;
    }
    box.append(list);
  }
  return box;
}

function ask(form, point, doubt, read, unit) {
  const likely = inUnit(doubt.likely, unit, Math.max(3, read.digits)), typed = inUnit(read.si, unit, Math.max(3, read.digits));
  const times = Math.round(doubt.times >= 1 ? doubt.times : 1 / doubt.times), shouldBe = point.nominal + (instrumentOf(form, point)?.offset ?? 0);
  const box = advise(form, "doubtful", say(doubt.times >= 1 ? "times" : "part", { times, nominal: inUnit(shouldBe, unit, point.digits) }));
  const row = box.appendChild(document.createElement("p"));
  row.className = "answers";
  const button = (words, act) => {
    const b = row.appendChild(document.createElement("button"));
    Object.assign(b, { type: "button", textContent: words, onclick: act });
    return b;
  };
  button(say("didYouMean", { likely }), () => {
    form.elements.text.value = likely.replace(unit.text, "").trim();
    typing(form, point);
    save(form, point);
  }).focus();
  button(say("keepIt", { typed }), () => save(form, point, true));
}

function save(form, point, sure = false) {
  const { unit, read, meter } = readForm(form, point), field = form.elements.text;
  if (read.problem) {
    field.setAttribute("aria-invalid", "true");
    form.querySelector("output").textContent = problemWords(read, point);
    if (!document.title.startsWith(say("errorTitle"))) document.title = say("errorTitle") + document.title;
    field.focus();
    return;
  }
  const first = judge(read.si, point, meter);
  if (first.verdict === "doubtful" && !sure) { ask(form, point, first, read, unit); return; }
  const kept = put({ type: "reading", point: point.point, si: read.si, typed: field.value.trim() + (/[a-zA-Z\u00b5\u03bc\u03a9%]\s*$/.test(field.value) ? "" : ` ${unit.text}`), instrument: meter?.name ?? null, confirmed: sure });
  form.dataset.last = kept.id;
  drafts.drop(point.point);
  advise(form, first.verdict, say(`first_${first.verdict}`), reached ? [] : [say("later")]);
  phase(form, first.verdict === "good" || first.verdict === "noted" ? "good" : "again");
}

function showAnswer(item, sent) {
  const form = forms.get(sent.point);
  if (!form) return;
  if (item.refused) { advise(form, "out", item.refused); phase(form, "typing"); return; }
  if (form.dataset.last && form.dataset.last !== item.id) return;
  advise(form, item.advice.verdict, item.advice.heading, item.advice.steps);
  if (form.dataset.phase !== "typing") phase(form, item.advice.goOn ? "good" : "again");
}

function typing(form, point) {
  form.elements.text.removeAttribute("aria-invalid");
  document.title = document.title.replace(say("errorTitle"), "");
  phase(form, "typing");
  form.querySelector("[data-advice]").hidden = true;
  drafts.keep(point.point, { text: form.elements.text.value, unit: form.querySelector("[name^=unit]:checked")?.value ?? "0" });
  echo(form, point);
}

for (const [id, form] of forms) {
  const point = pointOf.get(id), draft = drafts.of(id);
  const meterKey = `clubbench.meter.${point.instrumentClass}`, meter = localStorage.getItem(meterKey);
  if (meter && point.instruments.some(i => i.name === meter)) form.elements.instrument.value = meter;
  if (draft) {
    form.elements.text.value = draft.text;
    const unit = form.querySelector(`[name^=unit][value="${draft.unit}"]`);
    if (unit) unit.checked = true;
    form.querySelector("[data-kept]").hidden = false;
    form.querySelector("[data-kept]").textContent = say("kept", { clock: new Date(draft.at).toLocaleTimeString([], { hour: "2-digit", minute: "2-digit", hour12: false }) });
  }
  showWindow(form, point);
  if (draft) echo(form, point);
  form.elements.text.addEventListener("input", () => typing(form, point));
  form.addEventListener("change", e => {
    if (e.target.name === "instrument") localStorage.setItem(meterKey, e.target.value);
    showWindow(form, point);
    echo(form, point);
  });
  form.addEventListener("submit", e => { e.preventDefault(); save(form, point); });
  form.querySelector("[data-again]")?.addEventListener("click", () => {
    form.elements.text.value = "";
    typing(form, point);
    form.elements.text.focus();
  });
}

// ---- turns wound, progress, help ----
function showPlainAnswer(item, sent) {
  const box = document.querySelector(`[data-answer="${sent.answer}"]`);
  if (box) { box.hidden = false; box.textContent = item.refused ?? item.words; box.dataset.verdict = item.refused ? "out" : "good"; }
}

for (const form of document.querySelectorAll("form.fitted"))
  form.addEventListener("submit", e => {
    e.preventDefault();
    const turns = Number(form.elements.turns.value);
    const box = form.querySelector("[data-answer]");
    box.hidden = false;
    if (!Number.isInteger(turns) || turns < 1 || turns > 200) { box.textContent = say("turnsWhole"); form.elements.turns.focus(); return; }
    box.textContent = say("turnsKept", { turns });
    put({ type: "fitted", stage: form.dataset.stage, designator: form.dataset.designator, turns, answer: box.dataset.answer });
  });

for (const button of document.querySelectorAll("[data-move]"))
  button.addEventListener("click", () => put({ type: "move", stage: button.dataset.stage, to: button.dataset.move, answer: `move-${button.dataset.stage}` }));

const help = document.getElementById("help");
for (const button of document.querySelectorAll("[data-help]"))
  button.addEventListener("click", () => { help.querySelector("form").dataset.stage = button.dataset.help; help.showModal(); });
help.querySelector("[data-close]").addEventListener("click", () => help.close());
help.querySelector("form").addEventListener("submit", e => {
  e.preventDefault();
  const form = e.target;
  put({ type: "help", stage: form.dataset.stage, safety: form.elements.why.value === "safety", symptom: form.elements.symptom.value.trim(), answer: "help" });
  document.getElementById("called").hidden = false;
  document.getElementById("called").textContent = say(reached ? "called" : "calledLater");
  form.reset();
  help.close();
});

// ---- leaving: typed text goes, what waits to be sent stays ----
document.querySelector("form.sign-out")?.addEventListener("submit", () => {
  for (const key of Object.keys(localStorage)) if (key.startsWith("clubbench.draft.")) localStorage.removeItem(key);
});

// ---- what others did ----
async function poll() {
  try {
    const response = await fetch(page.changesUrl, { credentials: "same-origin", signal: AbortSignal.timeout(5000) });
    if (response.status === 401 || response.status === 403) { showSync("signedOut"); return; }
    if (!response.ok) throw new Error(`answer ${response.status}`);
    const now = await response.json();
    page.token = now.token;
    for (const stage of now.stages)
      for (const e of document.querySelectorAll(`[data-state-of="${stage.key}"]`)) { e.dataset.state = stage.glyph; e.querySelector("[data-word]").textContent = stage.words; }
    document.getElementById("called").hidden = now.call === "";
    document.getElementById("called").textContent = now.call;
    const wasAway = !reached;
    reached = true;
    document.body.dataset.net = "up";
    if (wasAway) { showSync("saved"); sender.send(); }
  } catch {
    if (reached) { reached = false; document.body.dataset.net = "down"; showSync("away"); }
  }
}
setInterval(() => { if (!document.hidden) poll(); }, 4000);

keepTicks(page.board);
oneStepAtATime(page.start);
showSync("open");
sender.send();
document.body.dataset.ready = "yes";
