"use strict";
(function () {
  // Beyond these a browser is at work for longer than somebody waits: bits of a value, and of all that are multiplied.
  const MOST_BITS = 600000;
  const MOST_WORK = 2800000;
  // Up to this order squaring is quicker than going step by step.
  const SQUARED_UP_TO = 12;
  const LONGEST_FRACTION = 60;
  const DIGITS = 15;

  function whole(text) {
    return text.trim() === "" ? [] : text.trim().split(" ").map(BigInt);
  }

  function sequence(element) {
    const data = element.dataset;
    return {
      scale: BigInt(data.scale), divisor: BigInt(data.divisor),
      recurrence: whole(data.recurrence), first: whole(data.first)
    };
  }

  function bits(n) {
    return (n < 0n ? -n : n).toString(16).length * 4;
  }

  // x^k modulo x^d - sum of c_i x^i, by squaring: the coefficients of y(0) ... y(d-1) in y(k).
  function power(k, c) {
    const d = c.length;
    const reduced = function (product) {
      for (let i = product.length - 1; i >= d; i--) {
        const top = product[i];
        for (let j = 0; top !== 0n && j < d; j++) {
          product[i - d + j] += top * c[j];
        }
      }
      return product.slice(0, d);
    };
    let result = [1n];
    for (const bit of k.toString(2)) {
      const square = Array(2 * result.length - 1).fill(0n);
      result.forEach(function (a, i) { result.forEach(function (b, j) { square[i + j] += a * b; }); });
      result = reduced(bit === "1" ? [0n].concat(square) : square);
    }
    return result;
  }

  function stepped(s, k) {
    const last = s.first.slice();
    for (let i = s.first.length; i <= k; i++) {
      let next = 0n;
      s.recurrence.forEach(function (c, j) { next += c * last[j]; });
      last.shift();
      last.push(next);
    }
    return last[last.length - 1];
  }

  // y(k) as numerator and positive denominator, not in lowest terms.
  function value(s, k) {
    const below = s.divisor * s.scale ** BigInt(k);
    if (k < s.first.length) {
      return [s.first[k], below];
    }
    if (s.first.length > SQUARED_UP_TO) {
      return [stepped(s, k), below];
    }
    const weights = power(k, s.recurrence);
    let above = 0n;
    weights.forEach(function (weight, i) { above += weight * s.first[i]; });
    return [above, below];
  }

  function lowest(fraction) {
    let [a, b] = [fraction[0] < 0n ? -fraction[0] : fraction[0], fraction[1]];
    while (b !== 0n) {
      [a, b] = [b, a % b];
    }
    return [fraction[0] / a, fraction[1] / a];
  }

  // Correctly rounded, half away from zero; cut is true where digits are left out.
  function decimal(fraction) {
    const negative = fraction[0] < 0n;
    const above = negative ? -fraction[0] : fraction[0];
    const below = fraction[1];
    if (above === 0n) {
      return {text: "0", exact: true};
    }
    let exponent = Math.floor((bits(above) - bits(below)) * 0.30102999566398);
    const atLeast = function (e) {
      return e >= 0 ? above >= below * 10n ** BigInt(e) : above * 10n ** BigInt(-e) >= below;
    };
    while (!atLeast(exponent)) { exponent--; }
    while (atLeast(exponent + 1)) { exponent++; }
    const shift = DIGITS - 1 - exponent;
    const up = shift >= 0 ? above * 10n ** BigInt(shift) : above;
    const down = shift >= 0 ? below : below * 10n ** BigInt(-shift);
    let rounded = (2n * up + down) / (2n * down);
    const exact = rounded * down === up;
    let digits = rounded.toString();
    if (digits.length > DIGITS) {
      digits = digits.slice(0, DIGITS);
      exponent++;
    }
    digits = exact ? digits.replace(/0+$/, "") || "0" : digits;
    return {text: (negative ? "\u2212" : "") + placed(digits, exponent), exact: exact};
  }

  function placed(digits, exponent) {
    if (exponent < -6 || exponent >= DIGITS) {
      return digits[0] + (digits.length > 1 ? "." + digits.slice(1) : "") + "e" + exponent;
    }
    if (exponent < 0) {
      return "0." + "0".repeat(-exponent - 1) + digits;
    }
    const before = digits.slice(0, exponent + 1).padEnd(exponent + 1, "0");
    return before + (digits.length > exponent + 1 ? "." + digits.slice(exponent + 1) : "");
  }

  function shown(s, k) {
    const raw = value(s, k);
    const isShort = bits(raw[1]) < 20000;
    const fraction = isShort ? lowest(raw) : raw;
    const found = decimal(fraction);
    const exact = fraction[0].toString().replace("-", "\u2212") + "/" + fraction[1].toString();
    const isWhole = fraction[1] === 1n;
    let text = found.exact ? "= " + found.text : "\u2248 " + found.text;
    if (isShort && !isWhole && exact.length <= LONGEST_FRACTION) {
      text += " = " + exact;
    }
    const rest = [fraction[1] - fraction[0], fraction[1]];
    if (rest[0] > 0n && rest[0] * 1000n < rest[1]) {
      const missing = decimal(isShort ? lowest(rest) : rest);
      text += "; 1 minus it " + (missing.exact ? "= " : "\u2248 ") + missing.text;
    }
    return text;
  }

  // In every figure the mark of this step, which a figure names in the mark's title.
  function marked(field, k) {
    const name = field.dataset.left.replace(/\(k\)$/, "(" + k + ")");
    document.querySelectorAll("figure svg title").forEach(function (title) {
      const text = title.textContent.replace(/\u00a0/g, " ");
      const isOfOutput = text.startsWith(field.dataset.left.replace(/k\)$/, ""));
      if (isOfOutput && title.parentNode.nodeName !== "svg") {
        title.parentNode.classList.toggle("chosen", k !== null && text.startsWith(name + " "));
      }
    });
  }

  function stepField(field) {
    const s = sequence(field);
    const input = field.querySelector("input");
    const output = field.querySelector("output");
    const most = Math.min(999999999, Math.floor(
      Math.min(MOST_BITS, MOST_WORK / Math.max(1, s.first.length)) / Math.max(1, bits(s.scale))));
    input.addEventListener("input", function () {
      const text = input.value.trim();
      const isStep = /^[0-9]+$/.test(text);
      const isWithin = isStep && Number(text) <= most;
      input.setAttribute("aria-invalid", String(text !== "" && !isWithin));
      output.textContent = text === "" ? "" : !isStep ? "A step is a whole number from 0 on."
        : !isWithin ? "Up to step " + most + " here; pofk derive --at " + text + " goes on." : shown(s, Number(text));
      marked(field, isWithin ? Number(text) : null);
    });
    field.hidden = false;
  }

  // The pieces of a formula in one element again, without their notes.
  function mathMl(display) {
    const math = Array.from(display.querySelectorAll(".formula math > semantics > mrow"))
      .map(function (row) { return row.outerHTML.replace(/&nbsp;/g, "\u00a0"); });
    return "<math xmlns=\"http://www.w3.org/1998/Math/MathML\" display=\"block\">" + math.join("") + "</math>";
  }

  function copied(text, status) {
    const done = function () { status.textContent = "copied"; };
    const byHand = function () {
      const area = document.createElement("textarea");
      area.value = text;
      document.body.append(area);
      area.select();
      status.textContent = document.execCommand("copy") ? "copied" : "not copied: the browser doesn't allow it";
      area.remove();
    };
    if (navigator.clipboard && window.isSecureContext) {
      navigator.clipboard.writeText(text).then(done, byHand);
    } else {
      byHand();
    }
  }

  function copyButtons(display) {
    const row = document.createElement("p");
    row.className = "copy";
    row.append("Copy as");
    const status = document.createElement("span");
    status.setAttribute("role", "status");
    const button = function (name, text) {
      const each = document.createElement("button");
      each.type = "button";
      each.textContent = name;
      each.dataset.copies = name;
      each.addEventListener("click", function () { copied(text(), status); });
      row.append(each);
    };
    button("LaTeX", function () { return display.dataset.latex; });
    button("MathML", function () { return mathMl(display); });
    button("text", function () { return display.dataset.text; });
    if (display.dataset.sheet) {
      button("spreadsheet, k in A1", function () { return display.dataset.sheet; });
    }
    row.append(status);
    display.append(row);
  }

  document.querySelectorAll(".step").forEach(stepField);
  document.querySelectorAll(".display").forEach(copyButtons);
}());
