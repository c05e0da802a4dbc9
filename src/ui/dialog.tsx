import type { JSX, ReactNode } from 'react'
import { Dialog as AriaDialog, Heading, Modal, ModalOverlay } from 'react-aria-components'

/** A question over the page; Escape and the close control leave it, focus goes back to where it was. */
export function Dialog({
  title,
  isOpen,
  onClose,
  children,
}: {
  readonly title: string
  readonly isOpen: boolean
  readonly onClose: () => void
  readonly children: ReactNode
}): JSX.Element {
  return (
    <ModalOverlay
      isOpen={isOpen}
      onOpenChange={(open) => {
        if (!open) onClose()
      }}
      isDismissable={false}
      className="fixed inset-0 z-40 flex items-start justify-center overflow-y-auto bg-ink/50 p-3 sm:p-8"
    >
      <Modal className="w-full max-w-xl border-2 border-ink bg-sheet">
        <AriaDialog className="p-5 outline-none">
          <Heading slot="title" className="score-line mb-4 flex items-center text-lg font-bold">
            {title}
          </Heading>
          {children}
        </AriaDialog>
      </Modal>
    </ModalOverlay>
  )
}
