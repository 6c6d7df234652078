import { useTranslation } from 'react-i18next'
import { Button } from '@/components/Button'
import { ButtonLink } from '@/components/ButtonLink'

const LINE_PANELS = ['ends', 'roofLine', 'names'] as const
export type LinePanel = (typeof LINE_PANELS)[number]

interface Props {
  /** Of the panel that the buttons open. */
  readonly id: string
  readonly open: LinePanel | null
  /** The names also stand open while something in them is missing. */
  readonly namesOpen: boolean
  /** A drawing that cannot be made has no ends to dress and covers no roof line. */
  readonly canDress: boolean
  readonly boardPath: string
  readonly onOpen: (panel: LinePanel | null) => void
  readonly onDuplicate: () => void
  readonly onRemove: () => void
}

/** What can be done with a line; its panels open below, one at a time. */
export function LineTools({
  id,
  open,
  namesOpen,
  canDress,
  boardPath,
  onOpen,
  onDuplicate,
  onRemove,
}: Props) {
  const { t } = useTranslation('orders')
  const isOpen = (panel: LinePanel) => (panel === 'names' ? namesOpen : open === panel)
  return (
    <div className="-mx-1.5 flex flex-wrap">
      {LINE_PANELS.map((panel) => (
        <Button
          key={panel}
          variant="quiet"
          className={`px-1.5! ${isOpen(panel) ? 'underline' : ''}`}
          aria-expanded={isOpen(panel)}
          aria-controls={id}
          disabled={panel !== 'names' && !canDress}
          onClick={() => onOpen(open === panel ? null : panel)}
        >
          {isOpen(panel) ? t(`line.panelClose.${panel}`) : t(`line.panel.${panel}`)}
        </Button>
      ))}
      <ButtonLink variant="quiet" className="px-1.5!" to={boardPath}>
        {t('line.editDrawing')}
      </ButtonLink>
      <Button variant="quiet" className="px-1.5!" onClick={onDuplicate}>
        {t('line.duplicate')}
      </Button>
      <Button variant="quiet" className="px-1.5!" onClick={onRemove}>
        {t('line.remove')}
      </Button>
    </div>
  )
}
