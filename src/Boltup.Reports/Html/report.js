"use strict";
(() => {
  const data = JSON.parse(document.getElementById("data").textContent);
  const floats = text => new Float32Array(Uint8Array.from(atob(text), c => c.charCodeAt(0)).buffer);
  const axes = data.axes.map(floats);
  const colour = name => getComputedStyle(document.documentElement).getPropertyValue(name).trim();
  const element = (name, text) => Object.assign(document.createElement(name), { textContent: text });
  const button = (text, act) => { const b = element("button", text); b.type = "button"; b.onclick = act; return b; };
  const room = { left: 46, right: 22, top: 10, bottom: 36 };
  const charts = [];
  const seen = new Map();
  // A page of many diagrams opens at once when each is drawn only as it comes near; printing draws all of them.
  const watcher = new IntersectionObserver(entries => {
    for (const entry of entries) if (entry.isIntersecting) { watcher.unobserve(entry.target); seen.get(entry.target)(); }
  }, { rootMargin: "600px" });

  function plainTicks(low, high) {
    const ticks = [];
    for (let decade = Math.floor(Math.log10(low)); 10 ** decade <= high; decade++)
      for (const factor of [1, 2, 5]) {
        const hz = factor * 10 ** decade;
        if (hz >= low && hz <= high) ticks.push(hz);
      }
    return ticks;
  }

  function chart(figure) {
    const source = data.charts[+figure.dataset.chart];
    const lines = source.lines.map(line => ({ name: line.name, hz: axes[line.axis], db: floats(line.levels), shown: true, index: line.axis % 8 }));
    const whole = [Math.min(...lines.map(l => l.hz.find(f => f > 0))), Math.max(...lines.map(l => l.hz[l.hz.length - 1]))];
    if (!(whole[1] > whole[0])) { whole[0] *= 0.9; whole[1] = whole[0] * 1.25; }
    let view = [...whole], cursor = null, drag = null;
    const title = figure.querySelector("figcaption").textContent;
    const canvas = element("canvas", "");
    canvas.tabIndex = 0;
    canvas.setAttribute("role", "img");
    canvas.setAttribute("aria-label", title + ". Arrow keys read values, plus and minus zoom, zero shows everything.");
    const readout = element("output", "");
    const tools = element("div", "");
    tools.className = "tools";
    figure.append(canvas, readout, tools);

    lines.forEach(line => {
      const label = element("label", ""), box = element("input", ""), swatch = element("span", "");
      box.type = "checkbox"; box.checked = true;
      box.onchange = () => { line.shown = box.checked; draw(); say(); };
      swatch.className = "swatch"; swatch.style.background = `var(--line${line.index})`;
      label.append(box, " ", swatch, " " + line.name);
      tools.append(label);
    });
    tools.append(button("Zoom in", () => zoom(0.5)), button("Zoom out", () => zoom(2)), button("Show everything", () => show(...whole)));

    const width = () => canvas.clientWidth - room.left - room.right;
    const height = () => canvas.clientHeight - room.top - room.bottom;
    const xOf = hz => room.left + width() * Math.log(hz / view[0]) / Math.log(view[1] / view[0]);
    const hzOf = x => view[0] * (view[1] / view[0]) ** Math.min(1, Math.max(0, (x - room.left) / width()));

    function show(low, high) { view = [Math.max(whole[0], low), Math.min(whole[1], high)]; draw(); }
    function zoom(factor) {
      const middle = cursor ?? Math.sqrt(view[0] * view[1]), span = Math.log(view[1] / view[0]) / 2 * factor;
      if (span > 0.002) show(middle * Math.exp(-span), middle * Math.exp(span));
    }

    function nearest(hz, at) {
      let low = 0, high = hz.length - 1;
      while (high - low > 1) { const mid = (low + high) >> 1; if (hz[mid] < at) low = mid; else high = mid; }
      return at - hz[low] < hz[high] - at ? low : high;
    }

    function say() {
      const shown = lines.filter(line => line.shown);
      if (cursor === null || shown.length === 0) { readout.textContent = ""; return; }
      readout.textContent = shown.map(line => {
        const i = nearest(line.hz, cursor), db = line.db[i];
        return `${line.name}: ${Number.isFinite(db) ? db.toFixed(1) + " dB" : "no level"} at ${+line.hz[i].toPrecision(6)} Hz`;
      }).join(" · ");
    }

    function limits() {
      const seen = [];
      for (const line of lines) if (line.shown)
        for (let i = 0; i < line.hz.length; i++)
          if (line.hz[i] >= view[0] && line.hz[i] <= view[1] && Number.isFinite(line.db[i])) seen.push(line.db[i]);
      if (seen.length === 0) return [0, 10];
      const sorted = Float32Array.from(seen).sort();
      // One deep notch does not rule the diagram: the lowest hundredth of the lines may leave it.
      return [Math.floor((sorted[Math.floor(sorted.length / 100)] - 2) / 10) * 10, Math.ceil((sorted[sorted.length - 1] + 2) / 10) * 10];
    }

    function draw() {
      const scale = Math.max(window.devicePixelRatio || 1, 2), pen = canvas.getContext("2d");
      canvas.width = canvas.clientWidth * scale; canvas.height = canvas.clientHeight * scale;
      pen.scale(scale, scale);
      const [low, high] = limits(), yOf = db => room.top + height() * (high - db) / (high - low);
      frame(pen, low, high, yOf);
      pen.save();
      pen.beginPath(); pen.rect(room.left, room.top, width(), height()); pen.clip();
      for (const line of lines) if (line.shown) trace(pen, line, yOf);
      if (cursor !== null) stroke(pen, "--text", 1, [[xOf(cursor), room.top], [xOf(cursor), room.top + height()]]);
      if (drag !== null) { pen.globalAlpha = 0.15; pen.fillStyle = colour("--text"); pen.fillRect(Math.min(drag.from, drag.to), room.top, Math.abs(drag.to - drag.from), height()); }
      pen.restore();
    }

    function stroke(pen, name, weight, points) {
      pen.strokeStyle = colour(name); pen.lineWidth = weight;
      pen.beginPath(); points.forEach(([x, y], i) => i ? pen.lineTo(x, y) : pen.moveTo(x, y)); pen.stroke();
    }

    function frame(pen, low, high, yOf) {
      pen.font = "12px system-ui, sans-serif"; pen.fillStyle = colour("--quiet");
      const step = (high - low) / 10 > 8 ? 20 : 10;
      pen.textAlign = "right"; pen.textBaseline = "middle";
      for (let db = Math.ceil(low / step) * step; db <= high; db += step) {
        stroke(pen, "--grid", 1, [[room.left, yOf(db)], [room.left + width(), yOf(db)]]);
        pen.fillText(String(db).replace("-", "\u2212"), room.left - 6, yOf(db));
      }
      pen.textAlign = "center"; pen.textBaseline = "top";
      for (const hz of plainTicks(...view)) {
        stroke(pen, "--grid", 1, [[xOf(hz), room.top], [xOf(hz), room.top + height()]]);
        pen.fillText(+hz.toPrecision(3), xOf(hz), room.top + height() + 4);
      }
      pen.fillText("Frequency in Hz", room.left + width() / 2, room.top + height() + 20);
    }

    // Lines that fall into one column of pixels are drawn from their lowest to their highest level.
    function trace(pen, line, yOf) {
      pen.strokeStyle = colour(`--line${line.index}`); pen.lineWidth = 1.6; pen.lineJoin = "round";
      pen.beginPath();
      let open = false, column = NaN, low = 0, high = 0;
      for (let i = 0; i < line.hz.length; i++) {
        if (!(line.hz[i] > 0)) continue;
        const x = Math.round(xOf(line.hz[i]) * 2) / 2, y = yOf(line.db[i]);
        if (!Number.isFinite(y)) { open = false; column = NaN; continue; }
        if (x === column && y >= low && y <= high) continue;
        if (x !== column) { low = high = y; column = x; } else { low = Math.min(low, y); high = Math.max(high, y); }
        if (open) pen.lineTo(x, y); else pen.moveTo(x, y);
        open = true;
      }
      pen.stroke();
    }

    const place = event => event.clientX - canvas.getBoundingClientRect().left;
    canvas.onpointerdown = event => { drag = { from: place(event), to: place(event) }; };
    canvas.onpointermove = event => { cursor = hzOf(place(event)); if (drag) drag.to = place(event); draw(); say(); };
    canvas.onpointerup = () => { const d = drag; drag = null; if (d && Math.abs(d.to - d.from) > 12) show(hzOf(Math.min(d.from, d.to)), hzOf(Math.max(d.from, d.to))); else draw(); };
    canvas.onpointerleave = canvas.onpointercancel = () => { cursor = drag = null; draw(); say(); };
    canvas.ondblclick = () => show(...whole);
    canvas.onkeydown = event => {
      const hz = lines[0].hz, now = cursor === null ? nearest(hz, view[0]) : nearest(hz, cursor);
      const move = step => { cursor = hz[Math.min(hz.length - 1, Math.max(0, now + step))]; draw(); say(); };
      const keys = { ArrowRight: () => move(1), ArrowLeft: () => move(-1), "+": () => zoom(0.5), "-": () => zoom(2), 0: () => show(...whole) };
      if (keys[event.key] && !event.ctrlKey && !event.metaKey) { event.preventDefault(); keys[event.key](); }
    };
    charts.push(draw);
    seen.set(canvas, draw);
    watcher.observe(canvas);
  }

  function sortable(table) {
    const body = table.tBodies[0];
    [...table.tHead.rows[0].cells].forEach((head, column) => {
      const name = head.textContent;
      const act = button(name, () => {
        const up = head.getAttribute("aria-sort") !== "ascending";
        const key = row => row.cells[column].dataset.value ?? row.cells[column].textContent;
        const numeric = body.rows[0]?.cells[column].dataset.value !== undefined;
        const rank = (a, b) => numeric ? (key(a) === "" ? -Infinity : +key(a)) - (key(b) === "" ? -Infinity : +key(b)) || 0 : key(a).localeCompare(key(b), "en");
        body.append(...[...body.rows].sort((a, b) => up ? rank(a, b) : rank(b, a)));
        for (const other of table.tHead.rows[0].cells) other.removeAttribute("aria-sort");
        head.setAttribute("aria-sort", up ? "ascending" : "descending");
      });
      head.replaceChildren(act);
    });
  }

  const redraw = () => charts.forEach(draw => draw());
  document.querySelectorAll("figure.chart").forEach(chart);
  document.querySelectorAll("table").forEach(sortable);
  addEventListener("resize", redraw);
  for (const query of ["print", "(prefers-color-scheme: dark)"]) matchMedia(query).addEventListener("change", redraw);
  addEventListener("beforeprint", redraw);
  addEventListener("beforeprint", () => document.querySelectorAll("details").forEach(item => { item.open = true; }));
})();
