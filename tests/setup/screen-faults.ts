import type { Page } from "@playwright/test";

/** The smallest text and the smallest side of what is touched, in px; `floor` for lesser controls. */
export interface Least {
  text: number;
  target: number;
  floor: number;
}

/** What a person would see to be wrong with the page as it is now, in sentences; none is well. */
export function screenFaults(page: Page, least: Least): Promise<string[]> {
  return page.evaluate(findFaults, least);
}

/** Runs in the page, and so brings all that it needs within itself. */
function findFaults({ text, target, floor }: Least): string[] {
  const hidden = "script,style,svg,noscript,[aria-hidden=true],.sr-only";
  const lines: { box: DOMRect; words: string; parent: Element }[] = [];
  const faults = new Set<string>();

  const walker = document.createTreeWalker(document.body, NodeFilter.SHOW_TEXT);
  for (let node = walker.nextNode(); node; node = walker.nextNode()) {
    const words = (node.textContent ?? "").trim().slice(0, 30);
    const parent = node.parentElement;
    if (!words || !parent || parent.closest(hidden)) continue;
    const style = getComputedStyle(parent);
    if (style.visibility === "hidden" || style.display === "none") continue;
    const size = Number.parseFloat(style.fontSize);
    if (size < text) faults.add(`text of ${size} px: "${words}"`);
    const isCut = parent.scrollWidth > parent.clientWidth + 1 && style.overflowX === "hidden";
    if (isCut) faults.add(`cut off: "${words}"`);
    const range = document.createRange();
    range.selectNodeContents(node);
    for (const box of range.getClientRects()) {
      if (box.width < 2 || box.bottom < 0 || box.top > innerHeight) continue;
      if (box.right > innerWidth + 1 || box.left < -1) faults.add(`off the side: "${words}"`);
      if (box.bottom > innerHeight + 1) faults.add(`off the foot: "${words}"`);
      lines.push({ box, words, parent });
    }
  }

  for (const control of document.querySelectorAll("button,a[href],input,select,textarea")) {
    const box = control.getBoundingClientRect();
    if (box.width === 0 || getComputedStyle(control).visibility === "hidden") continue;
    const need = control.hasAttribute("data-minor") ? floor : target;
    const words = (control.textContent || control.ariaLabel || control.tagName).trim();
    const size = `${Math.round(box.width)} × ${Math.round(box.height)}`;
    if (Math.min(box.width, box.height) < need - 0.5) faults.add(`${size} to touch: "${words}"`);
    if (box.bottom > innerHeight + 1) faults.add(`off the foot: "${words}"`);
  }

  for (const [at, one] of lines.entries()) {
    for (const other of lines.slice(at + 1)) {
      if (one.parent.contains(other.parent) || other.parent.contains(one.parent)) continue;
      const [a, b] = [one.box, other.box];
      const wide = Math.min(a.right, b.right) - Math.max(a.left, b.left);
      const high = Math.min(a.bottom, b.bottom) - Math.max(a.top, b.top);
      const isOver = wide > 2 && high > Math.min(a.height, b.height) / 2;
      if (isOver) faults.add(`"${one.words}" lies over "${other.words}"`);
    }
  }
  return [...faults];
}
