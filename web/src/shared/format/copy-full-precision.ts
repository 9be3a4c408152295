/**
 * Copies every digit of the figures in a selection, not the rounded ones on screen.
 * Call once with the document; returns the way to switch it off.
 */
export function copyFullPrecision(page: Document): () => void {
  const onCopy = (event: ClipboardEvent) => {
    const selection = page.getSelection();
    if (!selection || selection.isCollapsed || !event.clipboardData) return;
    const text = textWithFullFigures(selection);
    if (text === null) return;
    event.clipboardData.setData('text/plain', text);
    event.preventDefault();
  };
  page.addEventListener('copy', onCopy);
  return () => page.removeEventListener('copy', onCopy);
}

/** Null where the selection holds no whole figure: then the browser's own copy is right. */
function textWithFullFigures(selection: Selection): string | null {
  const figures = [
    ...(selection.anchorNode?.ownerDocument?.querySelectorAll<HTMLDataElement>('data[value]') ?? []),
  ];
  const chosen = figures.filter(
    (figure) => selection.containsNode(figure, false) || holdsAllOf(selection, figure),
  );
  if (chosen.length === 0) return null;
  let text = selection.toString();
  let from = 0;
  for (const figure of chosen) {
    const shown = figure.innerText;
    const at = text.indexOf(shown, from);
    if (at < 0) continue;
    const unit = figure.title.slice(figure.value.length);
    text = text.slice(0, at) + figure.value + unit + text.slice(at + shown.length);
    from = at + figure.value.length + unit.length;
  }
  return text;
}

function holdsAllOf(selection: Selection, figure: HTMLElement): boolean {
  return figure.contains(selection.anchorNode) && selection.toString().trim() === figure.innerText.trim();
}
