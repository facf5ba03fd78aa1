/// <reference lib="dom" />
const place = (id) => document.getElementById(id)
const [query, variables, key, answer, status, run] = ['query', 'variables', 'key', 'answer', 'status', 'run'].map(place)

query.value = `query Pile($request: SinglePileRequestInput!) {
  singlePile(request: $request) {
    result { ultimateResistance shaftResistance baseResistance toeDepth layers { name shaftResistance } }
    notices { level text }
    meta { engine requestHash }
  }
}
`
variables.value = JSON.stringify(
  {
    request: {
      pile: { section: { shape: 'circular', diameter: '750 mm' }, length: 14, headDepth: 1, installation: 'bored' },
      ground: {
        waterTableDepth: 1.5,
        layers: [
          {
            name: 'stiff clay',
            thickness: 20,
            unitWeight: 20,
            soil: 'cohesive',
            undrainedShearStrength: { top: 60, bottom: 140 },
          },
        ],
      },
    },
  },
  null,
  2,
)

async function send() {
  run.disabled = true
  status.textContent = 'running'
  const started = performance.now()
  try {
    const body = JSON.stringify({ query: query.value, variables: JSON.parse(variables.value || '{}') })
    const headers = { 'content-type': 'application/json', accept: 'application/graphql-response+json' }
    if (key.value) headers.authorization = `Bearer ${key.value}`
    // The page stands one step below the endpoint.
    const response = await fetch(new URL('../graphql', location.href), { method: 'POST', headers, body })
    const text = await response.text()
    status.textContent = `${response.status}, ${Math.round(performance.now() - started)} ms`
    answer.textContent = JSON.stringify(JSON.parse(text), null, 2)
  } catch (error) {
    status.textContent = 'failed'
    answer.textContent = String(error)
  } finally {
    run.disabled = false
  }
}

run.addEventListener('click', send)
addEventListener('keydown', (event) => {
  if (event.key === 'Enter' && (event.ctrlKey || event.metaKey)) send()
})
