/** A botanical name as the trade sets it: italic, its cultivar upright in single quotation marks. */
export function BotanicalName({ name }: { name: string }) {
  const parts = name.split(/('[^']*(?:'[^'\s][^']*)*')/)
  return (
    <span className="botanical">
      {parts.map((part, i) => (i % 2 === 1 ? <span key={i} className="not-italic">{`‘${part.slice(1, -1)}’`}</span> : part))}
    </span>
  )
}
