/** Colours and strokes for a chart drawn by hand, read from the style sheet's tokens as the lighting has them now. */
export interface ChartInk {
  readonly paper: string;
  readonly sheet: string;
  readonly ink: string;
  readonly soft: string;
  readonly control: string;
  readonly hair: string;
  readonly faint: string;
  readonly node: string;
  readonly perigee: string;
  readonly caution: string;
  readonly fontFamily: string;
  readonly fontPx: number;
  readonly thinPx: number;
  readonly midPx: number;
  readonly heavyPx: number;
  readonly rulePx: number;
}

export function chartInkOf(element: HTMLElement): ChartInk {
  const style = getComputedStyle(element);
  const token = (name: string) => style.getPropertyValue(name).trim();
  const px = (name: string) => Number.parseFloat(token(name)) || 1;
  return {
    paper: token('--paper'),
    sheet: token('--sheet'),
    ink: token('--ink'),
    soft: token('--soft'),
    control: token('--control'),
    hair: token('--hair'),
    faint: token('--faint'),
    node: token('--node'),
    perigee: token('--perigee'),
    caution: token('--caution'),
    fontFamily: style.fontFamily,
    fontPx: Number.parseFloat(style.fontSize) || 14,
    thinPx: px('--line-thin'),
    midPx: px('--line-mid'),
    heavyPx: px('--line-heavy'),
    rulePx: px('--rule'),
  };
}
