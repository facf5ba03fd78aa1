/* Adds to the plan of the caps: a click on a heading sorts, pointing at a row or a cap shows the other. All is readable without. */
for (const table of document.querySelectorAll('table.caps')) {
  const body = table.tBodies[0]
  const headings = [...table.tHead.rows[0].cells]
  headings.forEach((heading, column) => {
    const words = heading.textContent.trim()
    if (words === 'drawn') return
    const button = document.createElement('button')
    button.type = 'button'
    button.textContent = words
    heading.replaceChildren(button)
    button.addEventListener('click', () => {
      const rising = heading.getAttribute('aria-sort') !== 'ascending'
      const value = (row) => {
        const text = row.cells[column].textContent.trim()
        const number = Number.parseFloat(
          text.replace('−', '-').replace(/×10([⁻⁰¹²³⁴⁵⁶⁷⁸⁹]+)/, (_, power) => `e${plain(power)}`),
        )
        return heading.classList.contains('num') ? (Number.isNaN(number) ? -1 : number) : text
      }
      const order = (a, b) => (typeof a === 'number' ? a - b : a.localeCompare(b, undefined, { numeric: true }))
      const rows = [...body.rows].sort((a, b) => (rising ? 1 : -1) * order(value(a), value(b)))
      body.append(...rows)
      for (const other of headings) other.removeAttribute('aria-sort')
      heading.setAttribute('aria-sort', rising ? 'ascending' : 'descending')
    })
  })
}

function plain(raised) {
  return [...raised].map((c) => (c === '⁻' ? '-' : '⁰¹²³⁴⁵⁶⁷⁸⁹'.indexOf(c))).join('')
}

function point(event) {
  const near = event.target.closest('[data-cap]')
  for (const marked of document.querySelectorAll('.pointed')) marked.classList.remove('pointed')
  if (near)
    for (const same of document.querySelectorAll(`[data-cap="${near.dataset.cap}"]`)) same.classList.add('pointed')
}
document.addEventListener('pointerover', point)
document.addEventListener('focusin', point)
for (const cap of document.querySelectorAll('g[data-cap]'))
  cap.addEventListener('click', () => {
    location.hash = `cap-${cap.dataset.cap}`
  })
