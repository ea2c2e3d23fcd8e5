/** The technical signs that the bundled font does not have. */
import { DRAWN_SIGNS, type DrawnSign } from './sheet-fonts'
import { CAP_HEIGHT } from './sheet-style'

/** Draws a sign in points and lays its spelling under it unseen, so that a text search finds it. */
export function drawSign(
  pdf: PDFKit.PDFDocument,
  sign: DrawnSign,
  x: number,
  baseline: number,
  size: number,
  colour: string,
): void {
  const { widthEm, spelling } = DRAWN_SIGNS[sign]
  pdf.save()
  pdf
    .fillOpacity(0)
    .font('manrope-regular-latin')
    .fontSize(size * 0.5)
  pdf.text(spelling, x, baseline, { lineBreak: false, baseline: 'alphabetic' })
  pdf.restore()
  pdf.fillOpacity(1)
  const w = widthEm * size
  const cap = CAP_HEIGHT * size
  const middle = baseline - cap / 2
  pdf.lineWidth(size * 0.075).lineJoin('miter')
  if (sign === '⌀') {
    pdf.circle(x + w / 2, middle, cap * 0.42)
    pdf.moveTo(x + w * 0.18, baseline + size * 0.02).lineTo(x + w * 0.82, baseline - cap - size * 0.02)
  } else if (sign === '→') {
    pdf.moveTo(x + w * 0.08, middle).lineTo(x + w * 0.92, middle)
    pdf.moveTo(x + w * 0.66, middle - size * 0.17).lineTo(x + w * 0.92, middle)
    pdf.lineTo(x + w * 0.66, middle + size * 0.17)
  } else if (sign === '□') {
    pdf.rect(x + w * 0.14, baseline - cap, w * 0.72, cap)
  } else {
    const [tip, back] = sign === '≥' ? [0.86, 0.14] : [0.14, 0.86]
    pdf.moveTo(x + w * back, middle - size * 0.26).lineTo(x + w * tip, middle - size * 0.02)
    pdf.lineTo(x + w * back, middle + size * 0.2)
    pdf.moveTo(x + w * 0.14, baseline).lineTo(x + w * 0.86, baseline)
  }
  pdf.stroke(colour)
}
