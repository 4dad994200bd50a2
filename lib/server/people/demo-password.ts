/** One password for all accounts of the demonstration. They exist only where the demonstration was asked for. */
export const DEMO_PASSWORD = 'quiet hedges at noon'
