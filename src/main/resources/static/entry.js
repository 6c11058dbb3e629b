// The entry page: Enter goes to the next field in sight and never saves; "same glasses as last time" copies without a round trip.
const form = document.querySelector("form.entry");
const fields = () =>
  [...form.querySelectorAll("input:not([type=hidden]), select, textarea, button.main")].filter(
    (field) => !field.closest("details:not([open])"),
  );

form?.addEventListener("keydown", (event) => {
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
    field.dispatchEvent(new Event("input", { bubbles: true }));
  });
  glasses[0]?.focus();
});
