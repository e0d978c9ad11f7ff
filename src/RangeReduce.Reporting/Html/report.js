// Reads the drawn curves themselves: a plot carries the scales of its axes, so no number is stored twice.
(function () {
  "use strict";
  const minus = "\u2212";
  const print = (value, decimals) => {
    const text = Math.abs(value).toFixed(Number(decimals));
    return Number(text) !== 0 && value < 0 ? minus + text : text;
  };
  const numbers = text => text.split(" ").map(Number);
  const make = (name, attributes, text) => {
    const element = document.createElement(name);
    for (const key in attributes) { element.setAttribute(key, attributes[key]); }
    if (text) { element.textContent = text; }
    return element;
  };

  // Values under the pointer.
  const points = curve => [...curve.querySelectorAll("polyline")].map(line => line.getAttribute("points").split(" ").map(pair => pair.split(",").map(Number)));
  const linear = ([p0, p1, v0, v1]) => pixel => v0 + (pixel - p0) / (p1 - p0) * (v1 - v0);

  function alongX(svg, at) {
    const x = linear(numbers(svg.dataset.x)), y = linear(numbers(svg.dataset.y));
    return { value: x(at.x), read: lines => {
      for (const line of lines) {
        for (let n = 1; n < line.length; n++) {
          const [a, b] = [line[n - 1], line[n]];
          if (at.x >= a[0] && at.x <= b[0] && b[0] > a[0]) { return y(a[1] + (at.x - a[0]) / (b[0] - a[0]) * (b[1] - a[1])); }
        }
      }
      return null;
    } };
  }

  function aroundCentre(svg, at) {
    const [cx, cy, radius, floor, top] = numbers(svg.dataset.polar);
    const angle = (x, y) => Math.atan2(x - cx, cy - y) * 180 / Math.PI;
    const here = angle(at.x, at.y);
    return { value: here, read: lines => {
      let best = null, least = 3;
      for (const line of lines) {
        for (const [x, y] of line) {
          const away = Math.abs(((angle(x, y) - here + 540) % 360) - 180);
          if (away < least) { least = away; best = floor + Math.hypot(x - cx, y - cy) / radius * (top - floor); }
        }
      }
      return best;
    } };
  }

  for (const svg of document.querySelectorAll("svg[data-names]")) {
    const [xName, xUnit, xDecimals, yUnit, yDecimals] = svg.dataset.names.split("|");
    const figure = svg.closest("figure");
    const curves = [...svg.querySelectorAll("g.curve[data-name]")].map(curve => ({ element: curve, name: curve.dataset.name, lines: points(curve) }));
    const box = make("div", { class: "readout", hidden: "" });
    figure.append(box);
    svg.addEventListener("pointermove", event => {
      const at = new DOMPoint(event.clientX, event.clientY).matrixTransform(svg.getScreenCTM().inverse());
      const reading = svg.dataset.polar ? aroundCentre(svg, at) : alongX(svg, at);
      const rows = curves.filter(curve => !curve.element.classList.contains("off")).map(curve => [curve.name, reading.read(curve.lines)]).filter(row => row[1] !== null);
      box.hidden = rows.length === 0;
      box.textContent = [xName + " = " + print(reading.value, xDecimals) + (xUnit === "°" ? xUnit : "\u202f" + xUnit)].concat(rows.map(row => row[0] + "  " + print(row[1], yDecimals) + "\u202f" + yUnit)).join("\n");
      const frame = figure.getBoundingClientRect();
      const left = event.clientX - frame.left;
      box.style.left = left > frame.width / 2 ? "auto" : left + 14 + "px";
      box.style.right = left > frame.width / 2 ? frame.width - left + 14 + "px" : "auto";
      box.style.top = event.clientY - frame.top + 14 + "px";
    });
    svg.addEventListener("pointerleave", () => { box.hidden = true; });
  }

  // States can be faded out of the plots.
  const states = [...new Set([...document.querySelectorAll("svg [data-state]")].map(element => element.dataset.state))];
  if (states.length > 1) {
    const tools = make("div", { class: "tools", role: "group", "aria-label": "States shown in the plots" }, "");
    tools.append(make("span", {}, "States in the plots:"));
    for (const state of states) {
      const box = make("input", { type: "checkbox", checked: "" });
      const label = make("label", {});
      label.append(box, state);
      tools.append(label);
      box.addEventListener("change", () => {
        for (const element of document.querySelectorAll("svg [data-state]")) {
          if (element.dataset.state === state) { element.classList.toggle("off", !box.checked); }
        }
      });
    }
    document.querySelector("nav").after(tools);
  }

  // Long tables can be sorted and filtered.
  const key = cell => {
    const text = cell.textContent.trim();
    const number = parseFloat(text.replace(minus, "-"));
    return cell.classList.contains("num") ? (isNaN(number) ? -Infinity : number) : text;
  };
  for (const table of document.querySelectorAll("table.sortable")) {
    const body = table.tBodies[0];
    [...table.tHead.rows[0].cells].forEach((head, column) => {
      const button = make("button", { type: "button", "aria-label": "Sort by " + head.textContent });
      const link = head.querySelector("a");
      button.append(...(link ? [document.createTextNode(head.textContent)] : head.childNodes));
      head.replaceChildren(button);
      button.addEventListener("click", () => {
        const down = head.getAttribute("aria-sort") === "ascending";
        for (const other of table.tHead.rows[0].cells) { other.removeAttribute("aria-sort"); }
        head.setAttribute("aria-sort", down ? "descending" : "ascending");
        const rows = [...body.rows].map(row => [key(row.cells[column]), row]);
        rows.sort(([a], [b]) => (a > b ? 1 : a === b ? 0 : -1) * (down ? -1 : 1));
        body.append(...rows.map(row => row[1]));
      });
    });
    if (body.rows.length > 8) {
      const label = make("label", { class: "filter" }, "Show rows with ");
      const input = make("input", { type: "search" });
      label.append(input);
      table.parentElement.before(label);
      input.addEventListener("input", () => {
        const wanted = input.value.toLowerCase();
        for (const row of body.rows) { row.hidden = !row.textContent.toLowerCase().includes(wanted); }
      });
    }
  }
})();
