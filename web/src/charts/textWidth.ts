let context: CanvasRenderingContext2D | null | undefined;

/** Width of chart text in the page's own font, px. */
export function textWidth(text: string, sizePx: number, weight: number): number {
  context ??= document.createElement('canvas').getContext('2d');
  if (context === null) return text.length * sizePx * 0.6;
  context.font = `${weight} ${sizePx}px ${getComputedStyle(document.body).fontFamily}`;
  return context.measureText(text).width;
}

/** The longest beginning of a text that fits, with an ellipsis when something is cut. */
export function fitted(text: string, widthPx: number, sizePx: number, weight: number): string {
  if (textWidth(text, sizePx, weight) <= widthPx) return text;
  let low = 0;
  let high = text.length;
  while (low < high) {
    const middle = Math.ceil((low + high) / 2);
    if (textWidth(`${text.slice(0, middle)}…`, sizePx, weight) <= widthPx) low = middle;
    else high = middle - 1;
  }
  return `${text.slice(0, low).trimEnd()}…`;
}
