/** The facade a drawing table is open on. */
export interface TableFacade {
  id: string
  name: string
  projectId: string
  projectName: string
}
