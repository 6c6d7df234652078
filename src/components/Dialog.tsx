import type { ReactNode } from 'react'
import { Dialog as AriaDialog, Heading, Modal, ModalOverlay } from 'react-aria-components'
import { Button } from '@/components/Button'
import type { ButtonVariant } from '@/components/button-style'

interface Props {
  readonly open: boolean
  /** The question. */
  readonly title: string
  /** What follows from the answer, or fields that belong to it. */
  readonly children?: ReactNode
  readonly confirm: string
  readonly confirmVariant?: ButtonVariant
  readonly confirmDisabled?: boolean
  readonly pending?: boolean
  readonly cancel: string
  readonly onConfirm: () => void
  readonly onCancel: () => void
}

/**
 * A question that must be answered, before anything else: pressing beside it does nothing, Escape
 * is "cancel". Load it with the page that asks.
 */
export function Dialog({
  open,
  title,
  children,
  confirm,
  confirmVariant = 'primary',
  confirmDisabled = false,
  pending = false,
  cancel,
  onConfirm,
  onCancel,
}: Props) {
  return (
    <ModalOverlay
      isOpen={open}
      onOpenChange={(next) => {
        if (!next && !pending) onCancel()
      }}
      className="fixed inset-0 z-50 flex items-end justify-center bg-(--veil) sm:items-center"
    >
      <Modal className="max-h-dvh w-full overflow-y-auto border-t-2 border-ink bg-sheet sm:max-w-lg sm:border-2">
        <AriaDialog role="alertdialog" className="flex flex-col gap-4 p-5 outline-none">
          <Heading slot="title" className="text-title font-bold">
            {title}
          </Heading>
          {children}
          <div className="flex flex-wrap gap-3">
            <Button className="flex-1" onClick={onCancel} disabled={pending}>
              {cancel}
            </Button>
            <Button
              className="flex-[1.6]"
              variant={confirmVariant}
              pending={pending}
              disabled={confirmDisabled}
              onClick={onConfirm}
            >
              {confirm}
            </Button>
          </div>
        </AriaDialog>
      </Modal>
    </ModalOverlay>
  )
}
