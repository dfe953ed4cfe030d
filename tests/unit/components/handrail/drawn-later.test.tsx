// @vitest-environment jsdom
import { waitFor } from '@testing-library/react'
import { act } from 'react'
import { hydrateRoot } from 'react-dom/client'
import { expect, it, vi } from 'vitest'
import { drawnLater } from '@/components/calculator/handrail/drawn-later'

vi.stubGlobal('IS_REACT_ACT_ENVIRONMENT', true)

it('keeps the strokes that the server drew until somebody stirs, and fetches nothing before', async () => {
  const load = vi.fn(() => Promise.resolve(({ says }: { says: string }) => <p>{says}</p>))
  const Later = drawnLater<{ says: string }>(load)
  const page = document.createElement('main')
  page.innerHTML = '<div class="drawn-later"><svg></svg></div>'
  document.body.append(page)
  const strokes = page.querySelector('svg')

  const root = await act(() => hydrateRoot(page, <Later says="one" />))
  await act(() => root.render(<Later says="two" />))
  expect(page.querySelector('svg')).toBe(strokes)
  expect(load).not.toHaveBeenCalled()

  await act(async () => {
    window.dispatchEvent(new Event('pointermove'))
    await Promise.resolve()
  })
  await waitFor(() => expect(page.textContent).toBe('two'))
  expect(page.querySelector('svg')).toBeNull()
  expect(load).toHaveBeenCalledTimes(1)
})
