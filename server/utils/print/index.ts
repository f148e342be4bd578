/** Everything that is printed. A plan goes in, a PDF comes out; nothing is calculated here. */
import type { Plan } from '#shared/types/plan'
import type { DocumentInfo } from './canvas'
import { drawLabels } from './drawLabel'
import { drawMixingCard } from './drawMixingCard'
import { drawPacket } from './drawPacket'
import { drawSheet } from './drawSheet'
import { labelModel } from './label'
import { mixingCardModel } from './mixingCard'
import type { PrintOptions } from './options'
import { packetModel } from './packet'
import { sheetModel, type SheetModel } from './sheet'

/**
 * The sheet for the enclosure: days of a plan with rows to write in, or a full-page DO NOT FEED.
 * @throws SheetRefusedError when something a carer needs is missing.
 */
export async function sheetPdf(plan: Plan, options: PrintOptions): Promise<Buffer> {
  const model = sheetModel(plan, options)
  return drawSheet(model, options.paper, infoOf(model.title, 'Feeding sheet', options))
}

/**
 * The card for the kitchen: what to weigh and measure, in steps, and labels for the pots.
 * @throws SheetRefusedError when something a mixer needs is missing.
 */
export async function mixingPdf(plan: Plan, options: PrintOptions): Promise<Buffer> {
  const model = mixingCardModel(plan, options)
  return drawMixingCard(model, options.paper, infoOf(model.title, 'Mixing card', options))
}

/**
 * Strips of half a page for the tub or the syringe box, one for each amount.
 * @throws SheetRefusedError when something a carer needs is missing.
 */
export async function labelPdf(plan: Plan, options: PrintOptions): Promise<Buffer> {
  const model = labelModel(plan, options)
  return drawLabels(model, options.paper, infoOf(model.title, 'Label', options))
}

/**
 * All that somebody needs who takes the animal home, as one file: a cover, the sheet or the sign, the mixing card.
 * @throws SheetRefusedError when something a carer needs is missing, or there is no number to ring.
 */
export async function packetPdf(plan: Plan, options: PrintOptions): Promise<Buffer> {
  const model = packetModel(plan, options)
  return drawPacket(model, options.paper, infoOf(model.title, 'Foster packet', options))
}

/**
 * The words of the enclosure sheet, for a screen that shows exactly what the paper says.
 * @throws SheetRefusedError where the sheet is refused.
 */
export function sheetOnScreen(plan: Plan, options: PrintOptions): SheetModel {
  return sheetModel(plan, options)
}

function infoOf(title: string, subject: string, options: PrintOptions): DocumentInfo {
  return { title, subject, author: options.teamName?.trim() ?? '', appVersion: options.appVersion, madeAt: options.madeAt }
}
