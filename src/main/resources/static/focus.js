// What was refused is read first: the summary of errors takes the focus when a page opens with one.
document.getElementById("errors")?.focus();
