/** The rules, in the order people meet them. A new rule is a file beside this one and a line here. */
import type { Rule } from '../rule'
import { balance } from './balance'
import { bloomGaps } from './bloom-gaps'
import { cornerHeight } from './corner-height'
import { cover } from './cover'
import { crowding } from './crowding'
import { deer } from './deer'
import { downspout } from './downspout'
import { entryHeight } from './entry-height'
import { evergreenShare } from './evergreen-share'
import { fireZone } from './fire-zone'
import { groundFall } from './ground-fall'
import { gutter } from './gutter'
import { hardToHold } from './hard-to-hold'
import { hardiness } from './hardiness'
import { invasive } from './invasive'
import { layerOrder } from './layer-order'
import { light } from './light'
import { moisture } from './moisture'
import { nativeShare } from './native-share'
import { numberView } from './number-view'
import { oddDrift } from './odd-drift'
import { openDrift } from './open-drift'
import { outsideBed } from './outside-bed'
import { rainShadow } from './rain-shadow'
import { sameGreen } from './same-green'
import { service } from './service'
import { sidingGap } from './siding-gap'
import { sill } from './sill'
import { thorns } from './thorns'
import { toxic } from './toxic'
import { treeDistance } from './tree-distance'
import { walkEdge } from './walk-edge'
import { wallGap } from './wall-gap'
import { walnut } from './walnut'

export const RULES: readonly Rule[] = [
  sill, walkEdge, wallGap, gutter, service, numberView, treeDistance, thorns, fireZone, outsideBed,
  crowding, layerOrder, openDrift,
  cornerHeight, entryHeight, cover, evergreenShare, bloomGaps, sameGreen, oddDrift, balance, nativeShare,
  hardiness, light, moisture, rainShadow, walnut, deer, toxic, invasive, hardToHold,
  groundFall, sidingGap, downspout,
]
