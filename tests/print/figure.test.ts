import { expect, test } from 'vitest'
import { figure, short } from '../../src/print/figure.ts'
import { html, trusted } from '../../src/print/markup.ts'
import { symbol } from '../../src/print/symbol.ts'

const seen = (value: number) => {
  const { sign, main, guard, power } = figure(value)
  return `${sign}${main}|${guard}${power === undefined ? '' : `e${power}`}`
}

test.each<[number, string, string]>([
  [0, '0|', '0'],
  [-0, '0|', '0'],
  [24, '24|', '24'],
  [0.5488213, '0.5488|213', '0.5488'],
  [0.00333333333, '0.003333|333', '0.003333'],
  [1427.712538501114, '1427|.713', '1428'],
  [18390.166408692916, '18390|.17', '18390'],
  [99999.99, '99999|.99', '100000'],
  [99999.999, '1|e5', '100000'],
  [533768.830596517, '5.337|688e5', '5.338×10⁵'],
  [30e6, '3|e7', '3×10⁷'],
  [4.854668037528625e-5, '4.854|668e-5', '4.855×10⁻⁵'],
  [-0.2, '−0.2|', '−0.2'],
  [-2043.5, '−2043|.5', '−2044'],
  [12.03125, '12.03|125', '12.03'],
  [100, '100|', '100'],
  [0.1 + 0.2, '0.3|', '0.3'],
])('%d is printed with guard figures and, in drawings, with four', (value, full, brief) => {
  expect(seen(value)).toBe(full)
  expect(short(value)).toBe(brief)
})

test('what is put into markup is text, unless markup made it', () => {
  expect(
    html`<p title="${'"x" onclick=1'}">${"<script>&'"}${html`<b>${1}</b>`}${false}${undefined}${['<', html`<i></i>`]}</p>`
      .text,
  ).toBe('<p title="&quot;x&quot; onclick=1">&lt;script&gt;&amp;&#39;<b>1</b>&lt;<i></i></p>')
  expect(html`${trusted('<br>')}`.text).toBe('<br>')
  expect(symbol('<img>_</sub>').text).not.toContain('<img>')
  expect(symbol('sigma_v').text).toBe('<span class="sym"><i>σ</i><sub>v</sub></span>')
})
