/** What the style sheets say of a mark, written onto it, so that the file looks the same anywhere. */
const STYLES = [
  'fill',
  'fill-opacity',
  'stroke',
  'stroke-width',
  'stroke-dasharray',
  'stroke-linecap',
  'stroke-linejoin',
  'stroke-opacity',
  'opacity',
  'font-size',
  'font-weight',
  'paint-order',
  'text-anchor',
  'vector-effect',
] as const

/** A drawing on the page as the text of an SVG file that needs no style sheet; its sentence is the title. */
export function writeSvgFile(drawing: SVGSVGElement): string {
  const copy = drawing.cloneNode(true) as SVGSVGElement
  const originals = drawing.querySelectorAll('*')
  copy.querySelectorAll('*').forEach((mark, index) => {
    const original = originals[index]
    if (!original) return
    const styles = getComputedStyle(original)
    for (const name of STYLES) {
      const value = styles.getPropertyValue(name)
      if (value !== '') mark.setAttribute(name, value)
    }
    mark.removeAttribute('class')
  })
  copy.removeAttribute('class')
  copy.setAttribute('xmlns', 'http://www.w3.org/2000/svg')
  copy.setAttribute('font-family', 'Nunito, sans-serif')
  const title = document.createElementNS('http://www.w3.org/2000/svg', 'title')
  title.textContent = drawing.getAttribute('aria-label') ?? ''
  copy.removeAttribute('aria-label')
  copy.prepend(title)
  return new XMLSerializer().serializeToString(copy)
}

/** Hands a drawing over as a file. */
export function downloadDrawing(drawing: SVGSVGElement, fileName: string) {
  const url = URL.createObjectURL(new Blob([writeSvgFile(drawing)], { type: 'image/svg+xml' }))
  const link = document.createElement('a')
  link.href = url
  link.download = fileName
  link.click()
  URL.revokeObjectURL(url)
}
