/** Fingers on the glass: the browser's own touch events, one or two at a time. */
import type { CDPSession, Page } from '@playwright/test'

interface Spot {
  x: number
  y: number
}

export class Fingers {
  private constructor(private readonly session: CDPSession) {}

  static async on(page: Page): Promise<Fingers> {
    return new Fingers(await page.context().newCDPSession(page))
  }

  private send(type: 'touchStart' | 'touchMove' | 'touchEnd', touchPoints: Spot[]) {
    return this.session.send('Input.dispatchTouchEvent', { type, touchPoints })
  }

  /** Every finger goes straight from where it is put down to where it is lifted. */
  async stroke(...paths: [from: Spot, to: Spot][]) {
    const steps = 8
    await this.send('touchStart', paths.map(([from]) => from))
    for (let i = 1; i <= steps; i++) {
      await this.send('touchMove', paths.map(([from, to]) => ({ x: from.x + ((to.x - from.x) * i) / steps, y: from.y + ((to.y - from.y) * i) / steps })))
    }
    await this.send('touchEnd', [])
  }

  async tap(spot: Spot) {
    await this.send('touchStart', [spot])
    await this.send('touchEnd', [])
  }
}
