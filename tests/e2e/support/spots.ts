/** Where things are on the screen's drawing, by the product's own scene and view. */
import type { Page } from '@playwright/test'
import { fitView, toScreen, type Spot } from '../../../components/drawing-table/editor/view'
import { buildScene } from '../../../lib/drawing'
import type { Sheet } from '../../../lib/spacing'

/** The table as it opens: the tenth summer, expected sizes, July, the whole drawing in the window. */
export async function spotsOn(page: Page, facadeId: string) {
  const { sheet } = (await (await page.request.get(`/api/facades/${facadeId}/sheet`)).json()) as { sheet: Sheet }
  const scene = buildScene({ sheet, year: 10, bound: 'expected', month: 7 })
  const frame = (await page.getByTestId('drawing-table').boundingBox())!
  const view = fitView(scene.box, frame)
  const onScreen = (spot: Spot): Spot => {
    const { x, y } = toScreen(view, spot)
    return { x: frame.x + x, y: frame.y + y }
  }
  return {
    sheet,
    scale: view.scale,
    /** A point of the plan: x along the wall, y out from the base line. */
    inPlan: (x: number, y: number) => onScreen({ x, y: scene.planY(y) }),
  }
}
