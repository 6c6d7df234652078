/** Lower case and without accents, so that `limatesa` finds `Limatesa` and `canalon` `Canalón`. */
const plain = (text: string): string =>
  text
    .normalize('NFD')
    .replace(/\p{Diacritic}/gu, '')
    .toLowerCase()

/** Every word searched for stands somewhere in the name. */
export const nameMatches = (name: string, search: string): boolean => {
  const words = plain(search).split(/\s+/).filter(Boolean)
  return words.every((word) => plain(name).includes(word))
}
