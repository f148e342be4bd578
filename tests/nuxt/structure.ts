/**
 * What a component must hold to be usable without sight or mouse, checked on its markup. Whole pages go through axe in a
 * real browser (tests/e2e/browser/pages.spec.ts); this catches the same slips at the component that makes them.
 */
export function slipsOf(root: Element): string[] {
  const slips: string[] = []
  const nameOf = (node: Element) => (node.getAttribute('aria-label') ?? labelledBy(root, node) ?? node.getAttribute('title') ?? node.textContent ?? '').trim()

  for (const field of root.querySelectorAll('input, select, textarea')) {
    const labelled = field.id !== '' && root.querySelector(`label[for="${field.id}"]`) !== null
    if (!labelled && !field.closest('label') && !field.getAttribute('aria-label') && !labelledBy(root, field)) slips.push(`a field without a label: ${shown(field)}`)
  }
  for (const picture of root.querySelectorAll('svg')) {
    const hidden = picture.getAttribute('aria-hidden') === 'true'
    const named = picture.getAttribute('role') === 'img' && (picture.getAttribute('aria-label') ?? '') !== ''
    if (!hidden && !named) slips.push(`a picture that is neither named nor hidden: ${shown(picture)}`)
  }
  for (const control of root.querySelectorAll('button, a[href], summary')) if (nameOf(control) === '') slips.push(`a control without a name: ${shown(control)}`)
  for (const frame of root.querySelectorAll('iframe')) if (!frame.getAttribute('title')) slips.push('a frame without a title')
  for (const head of root.querySelectorAll('th')) if (!head.getAttribute('scope')) slips.push(`a table head without a scope: ${shown(head)}`)
  for (const region of root.querySelectorAll('[role="region"], section, fieldset')) {
    if (region.tagName === 'FIELDSET' ? region.querySelector('legend') === null : !region.getAttribute('aria-label') && !labelledBy(root, region)) slips.push(`a part of the page without a name: ${shown(region)}`)
  }
  const ids = [...root.querySelectorAll('[id]')].map(node => node.id)
  for (const id of new Set(ids)) if (ids.filter(other => other === id).length > 1) slips.push(`the id ${id} twice`)
  for (const node of root.querySelectorAll('[aria-describedby], [aria-labelledby], [aria-controls]')) {
    for (const name of ['aria-describedby', 'aria-labelledby', 'aria-controls']) {
      for (const id of (node.getAttribute(name) ?? '').split(/\s+/).filter(Boolean)) if (!ids.includes(id)) slips.push(`${name} points to ${id}, which is not there`)
    }
  }
  return slips
}

function labelledBy(root: Element, node: Element): string | null {
  const ids = node.getAttribute('aria-labelledby')
  return ids === null ? null : ids.split(/\s+/).map(id => root.querySelector(`[id="${id}"]`)?.textContent ?? '').join(' ')
}

function shown(node: Element): string {
  return node.outerHTML.slice(0, 100)
}
