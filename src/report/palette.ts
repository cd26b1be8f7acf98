/** Kind of colour theme a picture is shown on; "neutral" where it is not known. */
export type Theme = "light" | "dark" | "highContrast" | "highContrastLight" | "neutral";

/**
 * Colours of a picture, as CSS writes them. No meaning rests on a colour alone: curves differ by dash, marks by shape.
 * Hues are blue, vermilion and purple, which stay apart in the common forms of colour blindness (common practice).
 */
export interface Palette {
  /** readings, words */
  readonly ink: string;
  /** axes, units, what stands behind */
  readonly faint: string;
  /** fitted curves, first to last; the first is the accent */
  readonly curves: readonly string[];
  /** chords and tangents */
  readonly mark: string;
  /** the ground that hollow signs are filled with; "none" where the picture lies on the page itself */
  readonly ground: string;
  /** opacity of the 95 % band */
  readonly band: number;
  /** a card under the picture, so that it is legible on any ground */
  readonly card: boolean;
}

const light: Palette = {
  ink: "#24292e",
  faint: "#68707a",
  curves: ["#0f5f9e", "#7a3b8f", "#00695c"],
  mark: "#ad3f0c",
  ground: "none",
  band: 0.16,
  card: false,
};

const palettes: Readonly<Record<Theme, Palette>> = {
  light,
  dark: {
    ink: "#dde1e5",
    faint: "#9aa3ac",
    curves: ["#6fb7ee", "#d3a0e6", "#6fcdb9"],
    mark: "#f2a065",
    ground: "none",
    band: 0.2,
    card: false,
  },
  highContrast: {
    ink: "#ffffff",
    faint: "#ffffff",
    curves: ["#7cc7ff", "#e9b8ff", "#8ff0dc"],
    mark: "#ffb273",
    ground: "none",
    band: 0.3,
    card: false,
  },
  highContrastLight: {
    ink: "#000000",
    faint: "#000000",
    curves: ["#003f75", "#5a1770", "#004d43"],
    mark: "#8a2a00",
    ground: "none",
    band: 0.2,
    card: false,
  },
  neutral: { ...light, ground: "#fbfbf9", card: true },
};

/** The colours for a theme. */
export function paletteOf(theme: Theme): Palette {
  return palettes[theme];
}

/** Colours that the page's style sheet names, so that one picture serves light, dark and print. */
export const pagePalette: Palette = {
  ink: "var(--ink)",
  faint: "var(--faint)",
  curves: ["var(--curve-1)", "var(--curve-2)", "var(--curve-3)"],
  mark: "var(--mark)",
  ground: "none",
  band: 0.17,
  card: false,
};

/** The values of `pagePalette`’s names in a page of a theme, as CSS declarations. */
export function pageColours(theme: Theme): string {
  const { ink, faint, curves, mark } = palettes[theme];
  const named = curves.map((colour, index) => `--curve-${index + 1}: ${colour};`).join(" ");
  return `--ink: ${ink}; --faint: ${faint}; ${named} --mark: ${mark};`;
}
