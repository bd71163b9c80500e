import { memo } from 'react'
import { ChannelChip } from './channel-chip'
import { cellText, type FigureData } from './figure-data'

/** The numbers behind a drawing. Out of sight, in a clipped box, it is still read. */
export const FigureTable = memo(function FigureTable({ data }: { data: FigureData }) {
  const hits = new Set(data.hits)
  return (
    <table className="led">
      <caption className="sr">{data.caption}</caption>
      <thead>
        <tr>
          {data.columns.map((column, index) => (
            <th key={index} scope="col" className={index > 0 ? 'r' : undefined}>
              {column.channel ? <><ChannelChip channel={column.channel} /><span className="sr"> {column.head}</span></> : column.head}
              {column.unit ? <span className="u">{column.unit}</span> : null}
            </th>
          ))}
        </tr>
      </thead>
      <tbody>
        {data.rows.map((row, rowIndex) => (
          <tr key={rowIndex} className={hits.has(rowIndex) ? 'hit' : undefined}>
            {row.map((cell, index) => {
              const text = cellText(cell, data.columns[index])
              return index === 0 ? <th key={index} scope="row">{text}</th> : <td key={index} className="r">{text}</td>
            })}
          </tr>
        ))}
      </tbody>
    </table>
  )
})
