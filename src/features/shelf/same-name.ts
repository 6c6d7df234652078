import type { Profile } from '#shared/profile/profile.schema'
import type { ShelfProfile } from '#shared/shelf/shelf.contract'

/** A name stands on a company's shelf once, whatever its case. */
const asOne = (name: string): string => name.trim().toLowerCase()

/** The profile of a company's shelf that bears the name; starters are nobody's. */
export const findOfName = (
  items: readonly ShelfProfile[],
  companyId: string,
  name: string,
): ShelfProfile | undefined =>
  items.find((item) => item.company?.id === companyId && asOne(item.name) === asOne(name))

/** True where there is nothing to save: leg by leg and bend by bend the same. */
export const isSameDrawing = (a: Profile, b: Profile): boolean => plain(a) === plain(b)

/** A bend that follows nothing may say so or leave it out. */
const plain = ({ bends, ...rest }: Profile): string =>
  JSON.stringify([
    rest.legs,
    rest.hemA,
    rest.hemB,
    rest.colorSide,
    bends.map(({ turn, follows }) => [turn, follows ?? null]),
  ])
