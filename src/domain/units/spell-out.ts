const fractions: Record<string, string> = {
  '½': '1/2',
  '¼': '1/4',
  '¾': '3/4',
  '⅛': '1/8',
  '⅜': '3/8',
  '⅝': '5/8',
  '⅞': '7/8',
  '⅓': '1/3',
  '⅔': '2/3',
  '⅕': '1/5',
  '⅖': '2/5',
  '⅗': '3/5',
  '⅘': '4/5',
  '⅙': '1/6',
  '⅚': '5/6',
};

/** Why a text cannot be read, as a sentence that says what would be right. */
export interface Refused {
  refused: string;
}

/**
 * Rewrites what people write into the plain arithmetic that the parser reads: `16½"` becomes
 * `(16+1/2) inch`, `2×150` becomes `2*150`, `41,2` becomes `41.2`. A comma that may be either a
 * decimal or a thousands sign is refused, never guessed.
 */
export function spellOut(text: string): string | Refused {
  let plain = text
    .replace(/[½¼¾⅛⅜⅝⅞⅓⅔⅕⅖⅗⅘⅙⅚]/g, (sign) => ` ${fractions[sign]!}`)
    .replace(/(\d)\u2044(\d)/g, '$1/$2')
    .replace(/[″”“]|''|’’/g, '"')
    .replace(/[′’‘]/g, "'")
    .replace(/[×·⋅]/g, '*')
    .replace(/÷/g, '/')
    .replace(/[−–]/g, '-')
    .replace(/(\d)[\u2009\u202f\u00a0](?=\d{3}(?!\d))/g, '$1')
    .replace(/"/g, ' inch ')
    .replace(/'/g, ' ft ')
    .replace(/\s+/g, ' ')
    .trim()
    // 2 x 150 as well as 2×150
    .replace(/([\d)]) ?[xX] ?(?=[\d(])/g, '$1*');
  // one thousand two hundred as 1 200; not 16 125/1000, which is a mixed number
  plain = plain.replace(/(?<![\d.,/])\d{1,3}(?: \d{3})+(?![\d/])(?! ?\/)/g, (digits) =>
    digits.replace(/ /g, ''),
  );
  const comma = readCommas(plain);
  if (typeof comma !== 'string') return comma;
  // sixteen and a half: 16 1/2
  return comma.replace(/(?<![\d.])(\d+) (\d+) ?\/ ?(\d+)(?![\d.])/g, '($1+$2/$3)');
}

function readCommas(text: string): string | Refused {
  let refused: Refused | undefined;
  const plain = text.replace(/\d[\d.,]*\d|\d[.,]*|[.,]\d[\d.,]*/g, (number) => {
    if (!number.includes(',')) return number;
    const [whole = '', decimals = '', ...more] = number.split(',');
    const unsure = decimals.length === 3 && whole !== '0' && whole !== '';
    if (more.length > 0 || number.includes('.') || decimals === '' || unsure) {
      refused ??= {
        refused: `“${number}” can be read in two ways: write ${suggestions(number)}.`,
      };
    }
    return `${whole === '' ? '0' : whole}.${decimals}`;
  });
  return refused ?? plain;
}

function suggestions(number: string): string {
  const [whole = '', decimals = ''] = number.split(',');
  return /^\d+,\d{3}$/.test(number)
    ? `${whole}${decimals} for thousands or ${Number(`${whole}.${decimals}`)} for a decimal`
    : 'it with a decimal point and no sign for thousands, such as 1234.5';
}
