/** A piece as the floor calls it: the crew's mark and its number in the line, `A-3`; never `P11` for P1's first. */
export const pieceMark = ({
  mark,
  sequence,
}: {
  readonly mark: string
  readonly sequence: number
}): string => `${mark}-${sequence}`
