export * from './people'
export * from './plants'
export * from './projects'
