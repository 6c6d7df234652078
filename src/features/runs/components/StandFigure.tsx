interface Props {
  readonly text: string
  readonly testId: string
}

/** As many figures as stand in the card's column at the largest size; longer ones are set at 72 px. */
const LARGE_CHARACTERS = 5

/** A figure that is read from two metres. */
export function StandFigure({ text, testId }: Props) {
  return (
    <p
      data-testid={testId}
      className={`font-figure leading-none font-medium whitespace-nowrap ${text.length <= LARGE_CHARACTERS ? 'text-stand' : 'text-[4.5rem]'}`}
    >
      {text}
    </p>
  )
}
