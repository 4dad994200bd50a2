export * from './plant-list'
export * from './csv'
