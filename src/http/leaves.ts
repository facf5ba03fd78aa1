/** Told when the answer is sent, or the client has left: what still runs for it may end. */
export function leaves(raw: { on: (event: 'close', told: () => void) => unknown }): AbortSignal {
  const gone = new AbortController()
  raw.on('close', () => gone.abort())
  return gone.signal
}
