export * from './plant-list'
export * from './csv'
export * from './beds'
export * from './mulch'
