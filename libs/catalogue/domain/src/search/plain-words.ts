/** A text in small letters without accents, its blanks made one: "Entrecôte " and "entrecote" are the same to whoever looks. */
export const plainWords = (text: string): string =>
  text.normalize('NFD').replace(/\p{M}/gu, '').toLowerCase().trim().replace(/\s+/g, ' ');
