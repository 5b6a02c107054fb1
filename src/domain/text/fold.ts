/** Letters that Unicode does not take apart into a base letter and a mark. */
const WHOLE: Readonly<Record<string, string>> = { ł: 'l', ø: 'o', đ: 'd', ß: 'ss', æ: 'ae', œ: 'oe', ı: 'i' };

/** Text for comparing in a search: small letters without marks, so that `lukowska` finds `Łukowska`. */
export const foldText = (text: string): string =>
  text
    .normalize('NFKD')
    .replace(/\p{M}/gu, '')
    .toLowerCase()
    .replace(/[łøđßæœı]/g, (letter) => WHOLE[letter] ?? letter);
