/** Signs of the tools, drawn with one pen. Decorative: each button carries its name. */
function Sign({ children }: { children: React.ReactNode }) {
  return (
    <svg viewBox="0 0 24 24" aria-hidden="true" className="size-6 fill-none stroke-current" strokeWidth="1.8" strokeLinecap="round" strokeLinejoin="round">
      {children}
    </svg>
  )
}

export const UndoIcon = () => <Sign><path d="M8 5 4 9l4 4" /><path d="M4 9h9.5a5.5 5.5 0 0 1 0 11H9" /></Sign>
export const RedoIcon = () => <Sign><path d="m16 5 4 4-4 4" /><path d="M20 9h-9.5a5.5 5.5 0 0 0 0 11H15" /></Sign>
export const MoveIcon = () => <Sign><circle cx="12" cy="12" r="3.5" /><path d="M12 2.5v4M12 17.5v4M2.5 12h4M17.5 12h4" /></Sign>
export const PlantIcon = () => <Sign><path d="M12 21v-9" /><path d="M12 13c-5 0-7-3-7-7 5 0 7 3 7 7Z" /><path d="M12 11c0-4 2-6 6-6 0 4-2 6-6 6Z" /></Sign>
export const PickUpIcon = () => <Sign><path d="M12 15V4" /><path d="m8 8 4-4 4 4" /><path d="M5 20h14" /></Sign>
export const RoomIcon = () => <Sign><path d="M4 20h16" /><path d="M5 20c0-8 3-13 7-13s7 5 7 13" strokeDasharray="2.5 3" /><path d="M12 16v-5m-2 2 2-2 2 2" /></Sign>
export const NearerIcon = () => <Sign><path d="M12 6v12M6 12h12" /></Sign>
export const FartherIcon = () => <Sign><path d="M6 12h12" /></Sign>
export const FitIcon = () => <Sign><path d="M4 9V5h4M20 9V5h-4M4 15v4h4M20 15v4h-4" /></Sign>
export const HelpIcon = () => <Sign><path d="M9 9.2a3 3 0 1 1 4.4 2.7c-.9.5-1.4 1-1.4 2.1" /><path d="M12 17.6v.1" /></Sign>
export const RemoveIcon = () => <Sign><path d="m7 7 10 10M17 7 7 17" /></Sign>
