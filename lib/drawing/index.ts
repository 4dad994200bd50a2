export * from './types'
export * from './palette'
