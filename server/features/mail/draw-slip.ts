import bwipjs from 'bwip-js/node'
import type { DrawForMail } from '#server/features/mail/send-mail'
import { findSlipCode } from '#server/features/mail/slips.store'
import { SLIP_PICTURE } from '#server/features/mail/templates/order-ready'

/** Dots of one module: the symbol of eight characters (21 modules) is shown at about 200 points. */
const SCALE = 8
/** Modules of the quiet zone, as ISO/IEC 18004 asks for. */
const QUIET = 4

/** The slip's code as a QR code with its quiet zone, black on white whatever lies behind it. */
export const drawSlip: DrawForMail = async (db, { orderId }) => {
  const code = await findSlipCode(db, orderId)
  if (code === undefined) throw new Error(`Order ${orderId} has no slip.`)
  return [
    {
      name: `slip-${code}.png`,
      mediaType: 'image/png',
      contentId: SLIP_PICTURE,
      bytes: await slipPicture(code),
    },
  ]
}

export const slipPicture = (code: string): Promise<Uint8Array> =>
  bwipjs.toBuffer({
    bcid: 'qrcode',
    text: code,
    scale: SCALE,
    padding: QUIET,
    backgroundcolor: 'FFFFFF',
  })
