import type { Paper } from './chart-options';
import type { Sketch } from './sketch';

/** Patterns that tell the regions of a tank apart, on screen and on paper. */
export type Region = 'unusable' | 'usable' | 'headroom';

/** A figure of the box at the head, in its print form. */
export interface ChartFigure {
  label: string;
  figure: string;
  /** null where there is no figure but a word. */
  plusMinus: string | null;
  unit: string;
  /** "reading 487 mm · 144 kg" */
  detail: string;
}

export interface ChartTick {
  depthMm: number;
  /** null: a fine mark without a number. */
  label: string | null;
  weight: 'fine' | 'middle' | 'numbered';
}

/** The stick beside the table: everything by reading, mm. */
export interface ChartStick {
  heightMm: number;
  unit: string;
  ticks: readonly ChartTick[];
  regions: readonly { region: Region; fromMm: number; toMm: number }[];
  marks: readonly {
    depthMm: number;
    /** "half" */
    word: string;
    /** "61.5 L"; null where the litres say nothing. */
    volume: string | null;
    /** "163 mm": a mark of the stick. */
    reading: string;
  }[];
}

/** The sketch with its two outer sizes in print form and the level of the outlet on it. */
export interface ChartSketch extends Sketch {
  widthText: string;
  heightText: string;
  /** mm above the lowest point; null without an outlet or a stick, and on a tilted tank. */
  outletY: number | null;
}

export interface ChartColumn {
  key: 'depth' | 'volume' | 'plusMinus' | 'usable' | 'room' | 'mass';
  head: string;
}

export interface ChartRow {
  depthMm: number;
  /** One text a column, in the order of `columns`. */
  cells: readonly string[];
  /** Every fifth or so stands out, so that the eye finds its row again. */
  strong: boolean;
  region: Region;
}

export interface ChartNote {
  title: string;
  /** true where someone can be hurt: drawn with a sign. */
  caution: boolean;
  sentences: readonly string[];
}

/** A chart as plain data: what it says, before anybody draws it. */
export interface ChartReport {
  paper: Paper;
  /** For the document's properties. */
  title: string;
  author: string;
  /** ISO 8601: also the creation date of the file, so that the same revision gives the same bytes. */
  issuedAt: string;
  /** The biggest thing on the page. */
  liquid: string;
  tank: string;
  installation: string;
  workshop: string;
  /** "millimetres", "litres": always spelled out. */
  lengthWords: string;
  volumeWords: string;
  revision: string;
  /** A print of an old revision says so at the top; null while it is current. */
  superseded: string | null;
  box: readonly ChartFigure[];
  stick: ChartStick;
  sketch: ChartSketch | null;
  columns: readonly ChartColumn[];
  rows: readonly ChartRow[];
  /** Rows from one strong row to the next. */
  rowGroup: number;
  notes: readonly ChartNote[];
  trade: string;
  /** The strip at the foot of every page: label and text. */
  titleBlock: readonly { label: string; text: string }[];
}
