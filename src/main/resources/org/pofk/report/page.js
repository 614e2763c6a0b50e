"use strict";
(function () {
  // Beyond these a browser is at work for longer than somebody waits: bits of a value, and of all that are multiplied.
  const MOST_BITS = 600000;
  const MOST_WORK = 2800000;
  // Bits of all values that are stepped through in search of a target.
  const MOST_SEARCHED = 3e9;
  // Up to this order squaring is quicker than going step by step.
  const SQUARED_UP_TO = 12;
  const LONGEST_FRACTION = 60;
  const DIGITS = 15;

  function whole(text) {
    return text.trim() === "" ? [] : text.trim().split(" ").map(BigInt);
  }

  function sequence(element) {
    const data = element.dataset;
    const first = whole(data.first);
    return {
      scale: BigInt(data.scale), divisor: BigInt(data.divisor), recurrence: whole(data.recurrence), first: first,
      kept: first.slice()
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

  // A written number as numerator and positive denominator: 0.005, 5e-3, 1/200, 0.5 %; null for anything else.
  function written(text) {
    const found = /^([-\u2212]?)(?:(\d+)\/(\d+)|(\d+)(?:\.(\d+))?(?:e([-\u2212+]?\d{1,2}))?)(\s*%)?$/i.exec(text);
    if (!found || found[3] && BigInt(found[3]) === 0n) {
      return null;
    }
    const behind = found[5] || "";
    const power = Number((found[6] || "0").replace("\u2212", "-")) - behind.length - (found[7] ? 2 : 0);
    let above = BigInt(found[2] || found[4] + behind);
    let below = BigInt(found[3] || 1);
    above *= power > 0 ? 10n ** BigInt(power) : 1n;
    below *= power < 0 ? 10n ** BigInt(-power) : 1n;
    return [found[1] ? -above : above, below];
  }

  // The first step, up to the last one looked at, at which y is at the target or on its other side; else -1.
  // Every key that is typed searches again: above some order the values are kept, up to it only those still needed.
  function reaches(s, target, last) {
    const d = s.first.length;
    const values = d > SQUARED_UP_TO ? s.kept : s.first.slice();
    let below = s.divisor;
    for (let k = 0; k <= last; k++) {
      if (k >= values.length) {
        let next = 0n;
        s.recurrence.forEach(function (c, j) { next += c * values[k - d + j]; });
        values.push(next);
        if (values !== s.kept && d > 0) {
          values[k - d] = 0n;
        }
      }
      const ahead = values[k] * target[1] - target[0] * below;
      if (ahead === 0n || (ahead > 0n) !== startsAbove(s, target)) {
        return k;
      }
      below *= s.scale;
    }
    return -1;
  }

  function startsAbove(s, target) {
    return (s.first.length === 0 ? 0n : s.first[0]) * target[1] > target[0] * s.divisor;
  }

  // A step named in the title of a mark: its output, up to the parenthesis, and the step; null in other titles.
  function stepOf(title, output) {
    const text = title.textContent.replace(/\u00a0/g, " ");
    const found = text.startsWith(output) ? /^(\d+)\) /.exec(text.slice(output.length)) : null;
    return found && title.parentNode.dataset.x !== undefined ? Number(found[1]) : null;
  }

  // In every figure the mark of this step; a line across where the figure has steps around it but no mark for it.
  function marked(field, k) {
    const output = field.dataset.left.replace(/k\)$/, "");
    document.querySelectorAll("figure svg").forEach(function (svg) {
      svg.querySelectorAll("line.chosen").forEach(function (line) {
        if (line.dataset.of === output) {
          line.remove();
        }
      });
      const marks = Array.from(svg.querySelectorAll("title")).map(function (title) {
        return {step: stepOf(title, output), mark: title.parentNode};
      }).filter(function (each) { return each.step !== null; });
      marks.forEach(function (each) { each.mark.classList.toggle("chosen", each.step === k); });
      const before = marks.filter(function (each) { return each.step <= k; }).pop();
      const after = marks.find(function (each) { return each.step >= k; });
      if (k !== null && before && after && before.step < k && after.step > k) {
        const part = (k - before.step) / (after.step - before.step);
        const x = Number(before.mark.dataset.x) * (1 - part) + Number(after.mark.dataset.x) * part;
        across(svg, x, output);
      }
    });
  }

  function across(svg, x, output) {
    const heights = Array.from(svg.querySelectorAll("[data-y]")).map(function (mark) { return Number(mark.dataset.y); });
    const line = document.createElementNS(svg.namespaceURI, "line");
    const put = {x1: x, x2: x, y1: Math.min.apply(null, heights), y2: Math.max.apply(null, heights), "class": "chosen"};
    Object.keys(put).forEach(function (name) { line.setAttribute(name, put[name]); });
    line.dataset.of = output;
    svg.append(line);
  }

  function stepField(field) {
    const s = sequence(field);
    const at = field.querySelector(".at");
    const target = field.querySelector(".target");
    const output = field.querySelector("output");
    const most = Math.min(999999999, Math.floor(
      Math.min(MOST_BITS, MOST_WORK / Math.max(1, s.first.length)) / Math.max(1, bits(s.scale))));
    const last = Math.min(most, Math.floor(Math.sqrt(MOST_SEARCHED / (bits(s.scale) * (s.first.length + 2)))));
    const answered = function (input, isRight, text, k) {
      input.setAttribute("aria-invalid", String(!isRight));
      output.textContent = text;
      marked(field, k);
    };
    at.addEventListener("input", function () {
      const text = at.value.trim();
      const isStep = /^[0-9]+$/.test(text);
      const isWithin = isStep && Number(text) <= most;
      target.value = "";
      target.setAttribute("aria-invalid", "false");
      answered(at, text === "" || isWithin, text === "" ? "" : !isStep ? "A step is a whole number from 0 on."
        : !isWithin ? "Up to step " + most + " here; pofk derive --at " + text + " goes on." : shown(s, Number(text)),
        isWithin ? Number(text) : null);
    });
    target.addEventListener("input", function () {
      const text = target.value.trim();
      const number = written(text);
      at.value = "";
      at.setAttribute("aria-invalid", "false");
      const k = number ? reaches(s, number, last) : -1;
      answered(target, text === "" || number !== null, text === "" ? ""
        : !number ? "A number like 0.005, 1/200, 0.5 % or 5e-3."
        : k < 0 ? "Not up to step " + last + "; pofk when " + (startsAbove(s, number) ? "--at-most " : "--at-least ")
          + text.replace(/\s/g, "") + " decides it for every step."
        : "at k = " + k + ", where it is " + shown(s, k).replace(/^= /, ""), k < 0 ? null : k);
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
