import type { Installation } from '../installation/installation';
import type { IssuedRow } from '../table/request';
import type { TankDocument } from '../tank/document';
import type { TankSettings } from '../tank/settings';
import type { ChartOptions } from './chart-options';
import type { Sketch } from './sketch';

/** One frozen revision and its surroundings: all that a chart is made from. */
export interface ChartInput {
  workshopName: string;
  installation: Pick<Installation, 'name' | 'kind'>;
  tankName: string;
  revision: {
    letter: string;
    /** ISO 8601 instant. */
    issuedAt: string;
    /** Name of the person. */
    issuedBy: string;
    /** Letter of the revision before it. */
    replaces: string | null;
    note: string | null;
    /** SHA-256, hex. */
    hash: string;
    /** false once a later letter stands: the print then says so. */
    current: boolean;
  };
  /** As frozen into the revision. */
  design: TankDocument;
  settings: TankSettings;
  heightMm: number;
  /** dLevel/dReading: 1 unless a tank with a stick stands tilted. */
  levelPerReading: number;
  capacityL: number;
  errorL: number;
  /** ± of the brim, litres; null, of a revision from before it was frozen: then that of its last row. */
  brimPlusMinusL: number | null;
  /** Those between the printed ones too. */
  rows: readonly IssuedRow[];
  /** The elevation that a print shows (sketchOf); null leaves it out. */
  sketch: Sketch | null;
  options: ChartOptions;
}
