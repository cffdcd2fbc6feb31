/** The colours of the three themes as data. `app/globals.css` has the same values as variables; a test holds them equal. */
import type { Paint, Strength } from './types';

export const THEMES = ['light', 'dark', 'print'] as const;
export type ThemeName = (typeof THEMES)[number];

export interface Theme {
  readonly paints: Readonly<Record<Exclude<Paint, 'none'>, string>>;
  readonly strengths: Readonly<Record<Strength, number>>;
  /** Opacity of the heat tint per safe move, above its base of .05. */
  readonly heatStep: number;
}

const LIGHT: Theme = {
  paints: {
    paper: '#fbf8f1',
    raise: '#fffdf8',
    ink: '#1e2430',
    soft: '#5d5b54',
    hair: '#8d8a80',
    rule: '#d8d2c3',
    hatch: '#a39d8e',
    cross: '#6f6b61',
    ochre: '#8a5a06',
    indigo: '#2f3f8f',
    pick: '#b93a26',
    heat: '#1f6f6b',
    'ochre-wash': '#d99a2b',
    'indigo-wash': '#4658b4',
    'w-fill': '#fbf8f1',
    'w-line': '#1e2430',
    'w-cut': '#1e2430',
    'b-fill': '#1e2430',
    'b-line': '#1e2430',
    'b-cut': '#fbf8f1',
  },
  strengths: { 'wash-a': 0.13, 'band-a': 0.5, 'iwash-a': 0.17, 'iband-a': 0.54 },
  heatStep: 0.072,
};

const DARK: Theme = {
  paints: {
    paper: '#141a26',
    raise: '#1b2333',
    ink: '#e9e4d6',
    soft: '#b0ab9c',
    hair: '#7f7d76',
    rule: '#2c3547',
    hatch: '#465069',
    cross: '#8f8c84',
    ochre: '#f0bf62',
    indigo: '#aab6f5',
    pick: '#ff8a70',
    heat: '#5cc2b6',
    'ochre-wash': '#e8ac3a',
    'indigo-wash': '#7f8fe0',
    'w-fill': '#e9e4d6',
    'w-line': '#e9e4d6',
    'w-cut': '#141a26',
    'b-fill': '#141a26',
    'b-line': '#e9e4d6',
    'b-cut': '#e9e4d6',
  },
  strengths: { 'wash-a': 0.12, 'band-a': 0.66, 'iwash-a': 0.14, 'iband-a': 0.42 },
  heatStep: 0.056,
};

const PRINT: Theme = {
  paints: {
    paper: '#ffffff',
    raise: '#ffffff',
    ink: '#000000',
    soft: '#000000',
    hair: '#000000',
    rule: '#000000',
    hatch: '#000000',
    cross: '#000000',
    ochre: '#000000',
    indigo: '#000000',
    pick: '#000000',
    heat: '#000000',
    'ochre-wash': '#000000',
    'indigo-wash': '#000000',
    'w-fill': '#ffffff',
    'w-line': '#000000',
    'w-cut': '#000000',
    'b-fill': '#000000',
    'b-line': '#000000',
    'b-cut': '#ffffff',
  },
  strengths: { 'wash-a': 0, 'band-a': 0, 'iwash-a': 0, 'iband-a': 0 },
  heatStep: 0,
};

/** Every theme by name. */
export const THEME: Readonly<Record<ThemeName, Theme>> = { light: LIGHT, dark: DARK, print: PRINT };
