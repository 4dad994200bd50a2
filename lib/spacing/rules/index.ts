/** The rules, in the order people meet them. A new rule is a file beside this one and a line here. */
import type { Rule } from '../rule'
import { crowding } from './crowding'
import { gutter } from './gutter'
import { hardiness } from './hardiness'
import { layerOrder } from './layer-order'
import { light } from './light'
import { outsideBed } from './outside-bed'
import { sill } from './sill'
import { walkEdge } from './walk-edge'
import { wallGap } from './wall-gap'

export const RULES: readonly Rule[] = [sill, walkEdge, wallGap, gutter, outsideBed, crowding, layerOrder, hardiness, light]
