export * from './types'
export * from './schema'
