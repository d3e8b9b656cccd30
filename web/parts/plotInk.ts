/** Colours and strokes of a plot, read from the style sheet's tokens as the lighting has them now. */
export interface PlotInk {
  readonly node: string;
  readonly perigee: string;
  readonly ink: string;
  readonly grid: string;
  readonly label: string;
  readonly font: string;
  readonly fontPx: number;
  readonly thinPx: number;
  readonly dotPx: number;
  readonly heavyPx: number;
  readonly rulePx: number;
}

export function inkOf(element: HTMLElement): PlotInk {
  const style = getComputedStyle(element);
  const token = (name: string) => style.getPropertyValue(name).trim();
  const px = (name: string) => Number.parseFloat(token(name)) || 1;
  return {
    node: token('--node'),
    perigee: token('--perigee'),
    ink: token('--ink'),
    grid: token('--faint'),
    label: token('--soft'),
    font: `${style.fontSize} ${style.fontFamily}`,
    fontPx: Number.parseFloat(style.fontSize) || 14,
    thinPx: px('--line-thin'),
    dotPx: px('--line-mid'),
    heavyPx: px('--line-heavy'),
    rulePx: px('--rule'),
  };
}
