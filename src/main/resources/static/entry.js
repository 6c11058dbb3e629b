// The entry page: Enter goes to the next field in sight and never saves, glasses are copied without a round trip, and nothing
// typed is lost when the sign-in has lapsed. What is typed is read back by the server.
const form = document.querySelector("form.entry");
const lapsed = document.getElementById("lapsed");
const fields = () =>
  [...form.querySelectorAll("input:not([type=hidden]), select, textarea, button.main")].filter(
    (field) => !field.closest("details:not([open])"),
  );

// The access keys, in every browser by the same keys.
const keys = { s: "button[name=save]", g: "button[name=copy]" };
form?.addEventListener("keydown", (event) => {
  const button = event.altKey && !event.ctrlKey && form.querySelector(keys[event.key.toLowerCase()] ?? "no-key");
  if (button) {
    event.preventDefault();
    button.click();
  }
  if (event.key === "Enter" && event.target.matches("input, select")) {
    event.preventDefault();
    const all = fields();
    all[all.indexOf(event.target) + 1]?.focus();
  }
});

form?.querySelector("button[name=copy]")?.addEventListener("click", (event) => {
  event.preventDefault();
  const glasses = [...form.querySelectorAll("[data-last]")];
  glasses.forEach((field) => {
    field.value = field.dataset.last;
  });
  glasses[0]?.dispatchEvent(new Event("change", { bubbles: true }));
  glasses[0]?.focus();
});

// A line that says the same as before is left alone, so that a screen reader does not read it again.
document.body.addEventListener("htmx:oobBeforeSwap", (event) => {
  const { target, fragment } = event.detail;
  if (target.matches("output") && target.textContent.trim() === fragment.textContent.trim()) {
    event.detail.shouldSwap = false;
  }
});

// A refused read-back means that nobody is signed in any more, or somebody is again: signing in changes the token that a form
// must carry, so the page is asked for anew to find out. The page keeps its text until then.
const isSignedIn = async () => {
  const page = await fetch(form.action, { headers: { "HX-Request": "true" } });
  if (page.ok) {
    const fresh = new DOMParser().parseFromString(await page.text(), "text/html");
    form.elements._csrf.value = fresh.querySelector("form.entry input[name=_csrf]").value;
  }
  lapsed.hidden = page.ok;
  return page.ok;
};

form?.addEventListener("htmx:responseError", async (event) => {
  if ([401, 403].includes(event.detail.xhr.status) && (await isSignedIn())) {
    form.dispatchEvent(new Event("change"));
  }
});

form?.addEventListener("submit", async (event) => {
  if (lapsed.hidden) {
    return;
  }
  event.preventDefault();
  if (await isSignedIn()) {
    form.requestSubmit(event.submitter);
  } else {
    lapsed.scrollIntoView();
  }
});
