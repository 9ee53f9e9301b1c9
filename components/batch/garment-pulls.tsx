import { Card } from '@/components/ui/card';
import { Table, Tbody, Td, Th, Thead, Tr } from '@/components/ui/table';
import { StatusText } from '@/components/ui/tag';
import type { GarmentPull } from '@/lib/domain/packing/pull-garments';

/** Which garments to take from the shelf: a table per style with a row per colour and a column per size. Props: `pulls`. */
export function GarmentPulls({ pulls }: { pulls: readonly GarmentPull[] }) {
  return pulls.map((pull) => (
    <Card key={pull.style} flush title={`${pull.style} to pull`} aside={`${pull.total} in all`}>
      <Table caption={`${pull.style} to pull by colour and size`}>
        <Thead>
          <Th>Colour</Th>
          {pull.sizes.map((size) => (
            <Th key={size.code} end title={size.label}>
              {size.known ? size.code : <StatusText tone="care">{size.label}</StatusText>}
            </Th>
          ))}
          <Th end>All</Th>
        </Thead>
        <Tbody>
          {pull.colours.map((colour) => (
            <Tr key={`${colour.colour} ${colour.body} ${colour.sleeves}`}>
              <Td rowHead>
                <span className="inline-flex items-center gap-2 whitespace-nowrap">
                  <svg
                    aria-hidden
                    viewBox="0 0 24 16"
                    className="border-hem h-4 w-6 shrink-0 rounded-xs border"
                  >
                    <path fill={colour.body} d="M0 0h24v16H0z" />
                    <path fill={colour.sleeves} d="M0 0h5v16H0zM19 0h5v16h-5z" />
                  </svg>
                  {colour.colour}
                </span>
              </Td>
              {pull.sizes.map((size) => (
                <Td key={size.code} end>
                  {colour.sizes.find((entry) => entry.code === size.code)?.count ?? (
                    <span className="text-dusk">–</span>
                  )}
                </Td>
              ))}
              <Td end className="font-[600]">
                {colour.total}
              </Td>
            </Tr>
          ))}
        </Tbody>
      </Table>
    </Card>
  ));
}
