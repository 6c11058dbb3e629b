// Draws the two charts of the Course page from course.json. Knows shapes and colours; every number comes from the server.
"use strict";
(() => {
  const colour = (name) => getComputedStyle(document.documentElement).getPropertyValue(name).trim();
  const SERIES = [
    { name: "cycloplegicRight", of: (v) => v.derived.cycloplegicSeRight, axis: "d", point: "circle", dash: [], ink: "--ink" },
    { name: "cycloplegicLeft", of: (v) => v.derived.cycloplegicSeLeft, axis: "d", point: "rect", dash: [6, 3], ink: "--ink" },
    { name: "wornRight", of: (v) => v.derived.wornSeRight, axis: "d", point: false, dash: [2, 2], ink: "--accent", stepped: true },
    { name: "wornLeft", of: (v) => v.derived.wornSeLeft, axis: "d", point: false, dash: [8, 2, 2, 2], ink: "--accent", stepped: true },
    { name: "scDistance", of: (v) => v.derived.turns.scDistance, axis: "t", point: "triangle", dash: [2, 3], ink: "--quiet" },
    { name: "scNear", of: (v) => v.derived.turns.scNear, axis: "t", point: "rectRot", dash: [2, 3], ink: "--quiet" },
    { name: "ccDistance", of: (v) => v.derived.turns.ccDistance, axis: "t", point: "triangle", dash: [], ink: "--ink" },
    { name: "ccNear", of: (v) => v.derived.turns.ccNear, axis: "t", point: "rectRot", dash: [6, 3], ink: "--ink" },
    { name: "addNear", of: (v) => v.derived.turns.addNear, axis: "t", point: "star", dash: [], ink: "--accent" },
  ];
  const label = (name) => document.querySelector(`label[for="show-${name}"]`)?.textContent ?? document.getElementById("chart2-plot").dataset[name];
  const day = (iso) => new Date(iso + "T00:00:00Z").getTime();

  const nameOnLine = {
    id: "nameOnLine",
    afterDatasetsDraw(chart) {
      const ctx = chart.ctx;
      const ends = chart.data.datasets.map((set, i) => ({ set, meta: chart.getDatasetMeta(i) }))
        .filter(({ set, meta }) => set.label && meta.visible && meta.data.length)
        .map(({ set, meta }) => ({ set, y: meta.data[meta.data.length - 1].y, x: meta.data[meta.data.length - 1].x }))
        .sort((a, b) => a.y - b.y);
      let last = -Infinity;
      ctx.save();
      ctx.font = "12px system-ui, sans-serif";
      ctx.textBaseline = "middle";
      for (const end of ends) {
        const y = Math.max(end.y, last + 14);
        last = y;
        const x = chart.chartArea.right + 8;
        ctx.strokeStyle = ctx.fillStyle = end.set.borderColor;
        ctx.setLineDash([1, 2]);
        ctx.beginPath();
        ctx.moveTo(end.x, end.y);
        ctx.lineTo(x - 2, y);
        ctx.stroke();
        ctx.fillText(end.set.label, x, y);
      }
      ctx.restore();
    },
  };

  const limitBand = {
    id: "limitBand",
    beforeDatasetsDraw(chart, args, options) {
      const scale = chart.scales.t;
      const { left, right } = chart.chartArea;
      chart.ctx.save();
      chart.ctx.fillStyle = colour("--band");
      chart.ctx.fillRect(left, scale.getPixelForValue(options.limit), right - left,
        scale.getPixelForValue(0) - scale.getPixelForValue(options.limit));
      chart.ctx.restore();
    },
  };

  const marks = {
    id: "marks",
    afterDatasetsDraw(chart, args, options) {
      const ctx = chart.ctx;
      ctx.save();
      for (const mark of options.visits) {
        const x = chart.scales.x.getPixelForValue(mark.x);
        ctx.strokeStyle = ctx.fillStyle = mark.act ? colour("--act") : colour("--look");
        if (mark.act || mark.look) {
          ctx.lineWidth = 2;
          ctx.beginPath();
          ctx.arc(x, chart.scales.t.top + 8, 5, 0, 2 * Math.PI);
          ctx.stroke();
        }
        if (mark.glasses) {
          ctx.fillStyle = colour("--accent");
          ctx.fillRect(x - 3.5, chart.scales.t.bottom - 7, 7, 7);
        }
      }
      ctx.restore();
    },
  };

  const points = (course, of, x) => course.visits.filter((v) => of(v) != null).map((v) => ({ x: x(v), y: of(v), date: v.date }));

  const seriesSets = (course, x) => SERIES.map((s) => ({
    label: label(s.name), series: s.name, data: points(course, s.of, x), yAxisID: s.axis, stepped: s.stepped || false,
    borderColor: colour(s.ink), backgroundColor: colour("--paper"), borderDash: s.dash, borderWidth: s.stepped ? 2 : 1.5,
    pointStyle: s.point, pointRadius: s.point ? 5 : 0, pointHoverRadius: 8, pointBorderWidth: 2,
  }));

  const quiet = (data, dash, extra) => ({
    data, yAxisID: "d", borderColor: colour("--quiet"), borderDash: dash, borderWidth: 1, pointRadius: 0, pointHitRadius: 0, ...extra,
  });

  const trendSets = (course, at) => {
    const sets = [];
    for (const trend of [course.trend.right, course.trend.left]) {
      if (trend.projectedSe) {
        sets.push(quiet([{ x: at(trend.fittedFromAgeYears), y: trend.fittedSe },
          { x: at(trend.projectedAgeYears), y: trend.projectedSe.value }], [10, 4], {}));
      }
    }
    const published = course.trend.published;
    if (published.length > 1) {
      sets.push(quiet(published.map((p) => ({ x: at(p.ageYears), y: p.low })), [1, 4], { fill: "+1", backgroundColor: colour("--band") }));
      sets.push(quiet(published.map((p) => ({ x: at(p.ageYears), y: p.high })), [1, 4], {}));
    }
    return sets;
  };

  const axis = (title, extra) => ({
    title: { display: true, text: title, color: colour("--ink") }, ticks: { color: colour("--quiet") },
    grid: { color: colour("--rule") }, border: { color: colour("--edge") }, ...extra,
  });

  const base = (plugins) => ({
    animation: false, responsive: true, maintainAspectRatio: false, layout: { padding: { right: 150 } },
    interaction: { mode: "nearest", intersect: false }, plugins: { legend: { display: false }, ...plugins },
  });

  const spoken = (chart, set, point) => {
    const unit = set.yAxisID === "d" ? "D" : "Δ";
    return `${set.label}, ${point.date ?? ""} ${point.said ?? point.y} ${unit}`;
  };

  const readByKeys = (canvas, current, out) => {
    let at = -1;
    canvas.addEventListener("keydown", (event) => {
      if (event.key !== "ArrowRight" && event.key !== "ArrowLeft") return;
      const chart = current();
      const all = chart.data.datasets.flatMap((set, datasetIndex) => set.label && chart.isDatasetVisible(datasetIndex)
        ? set.data.map((point, index) => ({ set, point, datasetIndex, index })) : []);
      if (!all.length) return;
      event.preventDefault();
      at = (at + (event.key === "ArrowRight" ? 1 : all.length - 1) + (at < 0 && event.key === "ArrowLeft" ? 1 : 0)) % all.length;
      const here = all[at];
      chart.setActiveElements([{ datasetIndex: here.datasetIndex, index: here.index }]);
      chart.tooltip.setActiveElements([{ datasetIndex: here.datasetIndex, index: here.index }], { x: 0, y: 0 });
      chart.update();
      out.textContent = spoken(chart, here.set, here.point);
    });
  };

  const tooltip = { callbacks: { title: () => "", label: (item) => spoken(item.chart, item.dataset, item.raw) }, filter: (item) => Boolean(item.dataset.label) };

  const drawCourse = (canvas, course) => {
    const calendar = document.getElementById("chart1-calendar");
    const born = day(course.bornOn);
    const year = 365.2425 * 86400000;
    const at = (age) => (calendar.checked ? born + age * year : age);
    const x = (v) => (calendar.checked ? day(v.date) : v.ageYears);
    const visits = course.visits.map((v) => ({
      x: x(v), glasses: v.derived.glassesChanged,
      act: v.findings.some((f) => f.weight === "act"), look: v.findings.some((f) => f.weight === "look"),
    }));
    const xAxis = axis(canvas.dataset[calendar.checked ? "calendarTitle" : "ageTitle"], { type: "linear" });
    if (calendar.checked) xAxis.ticks.callback = (value) => new Date(value).toISOString().slice(0, 7);
    return new Chart(canvas, {
      type: "line",
      data: { datasets: [...seriesSets(course, x), ...trendSets(course, at)] },
      options: {
        ...base({ tooltip, limitBand: { limit: Number(canvas.dataset.limit) }, marks: { visits } }),
        scales: {
          x: xAxis,
          t: axis(canvas.dataset.tTitle, { stack: "one", stackWeight: 3, position: "left", suggestedMin: 0, suggestedMax: 20, grace: "5%" }),
          d: axis(canvas.dataset.dTitle, { stack: "one", stackWeight: 2, position: "left", offset: true, grace: "10%" }),
        },
      },
      plugins: [limitBand, marks, nameOnLine],
    });
  };

  const drawEffort = (canvas, course) => {
    const latest = course.visits[course.visits.length - 1];
    const model = latest.derived.accommodativeModel;
    const line = (of, extra, from = model.line) => ({ data: from.map((p) => ({ x: p.accommodation, y: of(p) })), pointRadius: 0, pointHitRadius: 0, borderColor: colour("--quiet"), ...extra });
    const readings = SERIES.filter((s) => s.axis === "t").concat([{ name: "trialNear", point: "crossRot", ink: "--accent" }]).map((s) => ({
      label: label(s.name), showLine: false, pointStyle: s.point, pointRadius: 7, pointBorderWidth: 2, borderColor: colour(s.ink), backgroundColor: colour("--paper"), yAxisID: "y",
      data: model.readings.filter((r) => r.condition === s.name).map((r) => ({ x: r.accommodation, y: r.turn, said: r.turn })),
    })).filter((set) => set.data.length);
    return new Chart(canvas, {
      type: "line",
      data: { datasets: [...readings, // what stands first is drawn last, on top
        line((p) => p.turn, { borderColor: colour("--accent"), borderWidth: 2, label: canvas.dataset.lineDistance }),
        line((p) => p.turn, { borderColor: colour("--accent"), borderWidth: 2, borderDash: [6, 4], label: canvas.dataset.lineNear }, model.lineNear),
        line((p) => p.low, { borderDash: [2, 4], borderWidth: 1, fill: "+1", backgroundColor: colour("--band") }),
        line((p) => p.high, { borderDash: [2, 4], borderWidth: 1 })] },
      options: {
        ...base({ tooltip }),
        scales: { x: axis(canvas.dataset.effortTitle, { type: "linear", beginAtZero: true }), y: axis(canvas.dataset.tTitle, { beginAtZero: true, grace: "5%" }) },
      },
      plugins: [nameOnLine],
    });
  };

  const start = async () => {
    const first = document.getElementById("chart1-plot");
    if (!first || typeof Chart === "undefined") return;
    const course = await (await fetch(first.dataset.course, { credentials: "same-origin" })).json();
    const second = document.getElementById("chart2-plot");
    const switches = document.getElementById("chart1-series");
    let chart1;
    const show = () => {
      chart1.data.datasets.forEach((set, i) => {
        if (set.series) chart1.setDatasetVisibility(i, document.getElementById("show-" + set.series).checked);
      });
      chart1.update();
    };
    const draw = () => {
      chart1?.destroy();
      chart1 = drawCourse(first, course);
      show();
    };
    draw();
    switches.hidden = false;
    switches.addEventListener("change", (event) => (event.target.id === "chart1-calendar" ? draw() : show()));
    let chart2 = drawEffort(second, course);
    readByKeys(first, () => chart1, document.getElementById("chart1-read"));
    readByKeys(second, () => chart2, document.getElementById("chart2-read"));
    const redraw = () => {
      draw();
      chart2.destroy();
      chart2 = drawEffort(second, course);
    };
    matchMedia("(prefers-color-scheme: dark)").addEventListener("change", redraw);
    document.documentElement.dataset.charts = "drawn";
  };
  start();
})();
