/** Green-black ink and its lighter mixtures; every one keeps its order on a photocopy. */
export const ink = {
  full: '#12241e',
  second: '#4b5d56',
  line: '#7f918a',
  hair: '#c9d3ce',
  wash: '#e3ebe7',
  paper: '#ffffff',
} as const;
