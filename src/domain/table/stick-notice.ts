/** What one stick cannot tell of this tank as it stands. Readings in mm. */
export type StickNotice =
  | {
      /** Liquid stands in pools that level out only above this reading. */
      what: 'pools';
      readingMm: number;
      pools: number;
    }
  | {
      /** A solid that displaces crosses the stick: it reads up to there, though there is liquid space above. */
      what: 'crossed';
      readingMm: number;
      by: string | null;
    };
