// Reads what a builder types into a number with a unit. Units and their spellings come with the page, from the server's own list.
const number = /^([+-]?)(\d+(?:[.,]\d*)?|[.,]\d+)((?:[eE][+-]?\d{1,3})?)([A-Za-z%]?[A-Za-z0-9/-]*)$/;
const letterAsMark = /^([+-]?)(\d*)([A-Za-z])(\d+)([A-Za-z]*)$/;

const plain = text => text
  .replace(/\s/g, "").replace(/[\u2212\u2013]/g, "-").replace(/[\u00b5\u03bc]/g, "u")
  .replace(/[\u03a9\u2126]/g, "ohm").replace(/\u00b0/g, "deg").replace(/\u00b2/g, "2");

/** Case is forgiven except where it tells milli from mega. */
const isSpelt = (typed, spelling) => typed.toLowerCase() === spelling.toLowerCase() && !(typed[0] === "M" && spelling[0] === "m");
const factorOf = (typed, point) => point.spellings.find(s => isSpelt(typed, s.spelling))?.factor;
const significant = digits => digits.replace(/[.,]/, "").replace(/^0+/, "").length;

/** { si, digits } or { problem, better } for one typed text; a bare number has the chosen unit. */
export function readEntry(text, point, chosen) {
  const typed = plain(text);
  if (typed === "") return { problem: "empty" };
  if ((typed.match(/[.,]/g) ?? []).length > 1) return { problem: "twoMarks", better: oneMark(typed) };
  const asMark = letterAsMark.exec(typed);
  if (asMark) {
    const [, sign, whole, letter, fraction, rest] = asMark;
    const factor = factorOf(letter + rest, point);
    return factor ? { si: scaled(`${sign}0${whole}.${fraction}`, factor), digits: significant(whole + fraction) } : { problem: "notThis" };
  }
  const match = number.exec(typed);
  if (!match) return { problem: "notNumber" };
  const [, sign, digits, exponent, unit] = match;
  const factor = unit === "" ? chosen.factor : factorOf(unit, point);
  if (!factor) return { problem: "notThis" };
  if (sign === "-" && !point.signed) return { problem: "negative" };
  return { si: scaled(sign + digits.replace(",", ".") + exponent, factor), digits: significant(digits) };
}

/** One conversion from the decimal text, so that 14.06 MHz is the number nearest to 14.06e6. */
function scaled(decimal, factor) {
  const power = Math.log10(factor), [mantissa, exponent = "0"] = decimal.split(/e/i);
  return Number.isInteger(power) ? Number(`${mantissa}e${Number(exponent) + power}`) : Number(decimal) * factor;
}

function oneMark(typed) {
  const first = typed.search(/[.,]/), rest = typed.slice(first + 1).replace(/[.,]/g, "").replace(/\D.*$/, "");
  return { dot: `${typed.slice(0, first)}.${rest}`, comma: `${typed.slice(0, first)},${rest}` };
}

/** A value in a unit with some significant digits. */
export function inUnit(si, unit, digits) {
  const value = si / unit.factor, size = Math.abs(value);
  const places = size === 0 ? 0 : Math.max(0, Math.min(9, digits - 1 - Math.floor(Math.log10(size) + 1e-12)));
  return `${value.toFixed(places).replace("-", "\u2212")}\u00a0${unit.text}`.trim();
}

const slips = [10, 0.1, 100, 0.01, 1000, 1e-3, 1e6, 1e-6];

/** First judgement on the device: noted, good, near, out, or doubtful with the value it probably was. */
export function judge(si, point, instrument) {
  if (!instrument) return { verdict: "noted" };
  const value = si - instrument.offset, width = point.high - point.low;
  const below = point.sides !== "AtMost", above = point.sides !== "AtLeast";
  const out = (below && value < point.low) || (above && value > point.high);
  if (out && below && above && point.slips) {
    const factor = slips.find(f => value * f >= point.low - width / 2 && value * f <= point.high + width / 2);
    if (factor) return { verdict: "doubtful", times: 1 / factor, likely: si * factor };
  }
  if (out) return { verdict: "out" };
  const edge = 0.5 * (instrument.relative * Math.abs(value) + instrument.absolute);
  const near = (below && value - edge < point.low) || (above && value + edge > point.high);
  return { verdict: near && (!below || !above || edge < width / 2) ? "near" : "good" };
}
