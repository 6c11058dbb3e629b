// The segment on a photograph: shows a picture, takes ten marks on it, and asks the server what they measure. The picture stays
// here: it is decoded in the browser and drawn, has no address, and only coordinates are sent. No arithmetic of the eye is done here.
"use strict";
(() => {
  const part = document.getElementById("photo");
  const form = part?.closest("form");
  if (!form) {
    return;
  }
  const byId = (id) => document.getElementById("photo-" + id);
  const [file, width, desk, canvas, step, list, result] = ["file", "width", "desk", "picture", "step", "marks", "result"].map(byId);
  const buttons = [...list.querySelectorAll("button")];
  const LARGEST_ZOOM = 8;
  const DRAG = 4; // a press that moves farther than this pans
  let [picture, marks, next, asked] = [null, [], 0, 0];
  let cross = { x: 0, y: 0 };
  let view = { zoom: 1, x: 0, y: 0 };

  // Places: of the picture in its own pixels, of the screen in those of the page.
  const size = () => ({ w: canvas.clientWidth, h: canvas.clientHeight });
  const scale = () => view.zoom * Math.min(size().w / picture.width, size().h / picture.height);
  const onScreen = (place) => ({ x: (place.x - view.x) * scale() + size().w / 2, y: (place.y - view.y) * scale() + size().h / 2 });
  const inPicture = (place) => ({ x: (place.x - size().w / 2) / scale() + view.x, y: (place.y - size().h / 2) / scale() + view.y });
  const between = (least, value, most) => Math.min(Math.max(value, least), most);
  const kept = (place) => ({ x: between(0, place.x, picture.width), y: between(0, place.y, picture.height) });

  // Every stroke is drawn twice, dark and broad under light and thin, so that it shows on any picture.
  const line = (pen, ax, ay, bx, by) => {
    for (const [colour, breadth] of [["#000000", 3], ["#ffffff", 1]]) {
      Object.assign(pen, { strokeStyle: colour, lineWidth: breadth });
      pen.beginPath();
      pen.moveTo(ax, ay);
      pen.lineTo(bx, by);
      pen.stroke();
    }
  };

  const drawMarks = (pen) => {
    Object.assign(pen, { font: "bold 13px sans-serif", fillStyle: "#ffffff" });
    marks.forEach((mark, i) => {
      if (!mark) {
        return;
      }
      const { x, y } = onScreen(mark);
      line(pen, x - 6, y, x + 6, y);
      line(pen, x, y - 6, x, y + 6);
      Object.assign(pen, { strokeStyle: "#000000", lineWidth: 3 });
      pen.strokeText(i + 1, x + 8, y - 6);
      pen.fillText(i + 1, x + 8, y - 6);
    });
    for (const start of [0, 5].filter((i) => marks[i] && marks[i + 1])) {
      const [a, b] = [onScreen(marks[start]), onScreen(marks[start + 1])];
      line(pen, a.x, a.y, b.x, b.y);
    }
  };

  const draw = () => {
    if (!picture || !canvas.clientWidth) {
      return;
    }
    const { w, h } = size();
    canvas.width = w * devicePixelRatio;
    canvas.height = h * devicePixelRatio;
    const pen = canvas.getContext("2d");
    pen.scale(devicePixelRatio, devicePixelRatio);
    const corner = onScreen({ x: 0, y: 0 });
    pen.drawImage(picture, corner.x, corner.y, picture.width * scale(), picture.height * scale());
    drawMarks(pen);
    const { x, y } = onScreen(cross);
    for (const side of [-1, 1]) {
      line(pen, x + 5 * side, y, x + 40 * side, y);
      line(pen, x, y + 5 * side, x, y + 40 * side);
    }
  };

  const tell = () => {
    buttons.forEach((button, i) => {
      button.firstElementChild.textContent = i + 1;
      button.lastElementChild.textContent = marks[i] ? part.dataset.marked : part.dataset.open;
      button.setAttribute("aria-current", i === next ? "step" : "false");
    });
    step.textContent = next < buttons.length
      ? `${next + 1} / ${buttons.length}: ${buttons[next].children[1].textContent}`
      : part.dataset.all;
    draw();
  };

  // What goes to the server: coordinates, the length of the line, and how coarse the screen was.
  const measure = async () => {
    if (buttons.some((_, i) => !marks[i])) {
      result.replaceChildren();
      return;
    }
    const body = new URLSearchParams({ width: width.value, _csrf: form.elements._csrf.value });
    buttons.forEach((button, i) => body.set(button.dataset.mark, `${marks[i].x.toFixed(2)} ${marks[i].y.toFixed(2)}`));
    body.set("pixels-per-step", Math.max(...marks.map((mark) => mark.step)).toFixed(4));
    const mine = ++asked;
    const answer = await fetch(part.dataset.action, { method: "POST", body, headers: { "HX-Request": "true" } }).catch(() => null);
    const text = [200, 422].includes(answer?.status) ? await answer.text() : null;
    if (mine !== asked) {
      return;
    }
    if (text === null) {
      result.textContent = part.dataset.failed;
      form.dispatchEvent(new Event("change")); // the page finds out whether the sign-in has lapsed
    } else {
      result.innerHTML = text;
    }
  };

  const setMark = () => {
    if (next === buttons.length) {
      return;
    }
    marks[next] = { x: cross.x, y: cross.y, step: 1 / scale() };
    const open = buttons.findIndex((_, i) => !marks[i]);
    next = open < 0 ? buttons.length : open;
    tell();
    measure();
  };

  const takeBack = () => {
    const last = marks[next] ? next : marks.findLastIndex(Boolean);
    if (last >= 0) {
      marks[last] = undefined;
      next = last;
      tell();
      measure();
    }
  };

  const look = (zoom, centre) => {
    const near = between(1, zoom, LARGEST_ZOOM);
    view = { zoom: near, ...kept(near === 1 ? { x: picture.width / 2, y: picture.height / 2 } : centre) };
    canvas.classList.toggle("near", near > 1);
    draw();
  };

  const moveCross = (dx, dy) => {
    cross = kept({ x: cross.x + dx / scale(), y: cross.y + dy / scale() });
    const [{ x, y }, { w, h }] = [onScreen(cross), size()];
    if (x < 30 || y < 30 || x > w - 30 || y > h - 30) {
      look(view.zoom, cross);
    }
    draw();
  };

  const actions = {
    in: () => look(view.zoom * 2, view),
    out: () => look(view.zoom / 2, view),
    whole: () => look(1, view),
    back: takeBack,
  };
  // Keys of the picture; arrows go by 1 or, with Shift, by 10.
  const keys = {
    ArrowLeft: (by) => moveCross(-by, 0),
    ArrowRight: (by) => moveCross(by, 0),
    ArrowUp: (by) => moveCross(0, -by),
    ArrowDown: (by) => moveCross(0, by),
    Enter: setMark,
    Backspace: takeBack,
    "+": () => look(view.zoom * 2, cross),
    "=": () => keys["+"](),
    "-": () => look(view.zoom / 2, cross),
  };

  const show = async () => {
    const shown = await createImageBitmap(file.files[0]).catch(() => null);
    picture?.close();
    [picture, marks, next, asked] = [shown, [], 0, asked + 1];
    desk.hidden = !picture;
    result.textContent = picture ? "" : part.dataset.unreadable;
    if (picture) {
      cross = { x: picture.width / 2, y: picture.height / 2 };
      look(1, cross);
      tell();
    }
  };

  // The form reads back and keeps what is typed into it; nothing of this part is a part of the visit.
  for (const kind of ["change", "input"]) {
    part.addEventListener(kind, (event) => event.stopPropagation());
  }
  part.addEventListener("keydown", (event) => {
    if (event.key === "Enter" && !event.altKey) {
      event.stopPropagation();
      if (event.target === width) {
        event.preventDefault();
        measure();
      }
    }
  });
  part.addEventListener("toggle", () => {
    width.value ||= form.elements.segment_style?.value.match(/\d+/)?.[0] ?? "";
  });
  file.addEventListener("change", () => file.files.length && show());
  width.addEventListener("change", measure);
  list.addEventListener("click", (event) => {
    const chosen = buttons.indexOf(event.target.closest("button"));
    if (chosen >= 0) {
      next = chosen;
      cross = marks[next] ?? cross;
      tell();
    }
  });
  part.addEventListener("click", (event) => {
    actions[event.target.dataset.do]?.();
    if (event.target.id === "photo-use") {
      const filled = [...result.querySelectorAll("[data-fill]")].map(({ dataset }) => {
        const field = form.elements[dataset.fill];
        field.value = dataset.value;
        return field;
      });
      ["input", "change"].forEach((kind) => filled.forEach((field) => field.dispatchEvent(new Event(kind, { bubbles: true }))));
      byId("used").hidden = false;
    }
  });
  canvas.addEventListener("keydown", (event) => {
    if (keys[event.key] && !event.ctrlKey && !event.altKey && !event.metaKey) {
      event.preventDefault();
      keys[event.key](event.shiftKey ? 10 : 1);
    }
  });

  // A press that stays in its place marks; one that moves pans.
  let press = null;
  canvas.addEventListener("pointerdown", (event) => {
    press = { x: event.offsetX, y: event.offsetY, from: { ...view }, dragged: false };
    canvas.setPointerCapture(event.pointerId);
  });
  canvas.addEventListener("pointermove", (event) => {
    const [dx, dy] = press ? [event.offsetX - press.x, event.offsetY - press.y] : [0, 0];
    if (press?.dragged || Math.hypot(dx, dy) > DRAG) {
      press.dragged = true;
      look(view.zoom, { x: press.from.x - dx / scale(), y: press.from.y - dy / scale() });
    }
  });
  canvas.addEventListener("pointerup", (event) => {
    if (press && !press.dragged) {
      cross = kept(inPicture({ x: event.offsetX, y: event.offsetY }));
      setMark();
    }
    press = null;
  });
  canvas.addEventListener("pointercancel", () => (press = null));
  new ResizeObserver(draw).observe(canvas);
  part.hidden = false;
})();
