const files = [
  { name: 'Packing lists', note: 'one for each team', kinds: ['PDF'] },
  { name: 'Bag labels', note: 'one for each player, with a code to scan', kinds: ['PDF'] },
  { name: 'Pull lists', note: 'garments by size, digits by kind', kinds: ['PDF', 'CSV'] },
  { name: 'Every piece', note: 'one row for each garment to press', kinds: ['CSV', 'JSON'] },
  { name: 'Manifest', note: 'a checksum of every file', kinds: ['JSON'] },
];

/** What the decorator's bundle holds. */
export function BundlePicture() {
  return (
    <ul>
      {files.map((file) => (
        <li
          key={file.name}
          className="border-hem flex items-center justify-between gap-3 border-t py-2 first:border-t-0 first:pt-0"
        >
          <span className="min-w-0">
            <span className="block font-[560]">{file.name}</span>
            <span className="type-small text-dusk block">{file.note}</span>
          </span>
          <span className="type-code text-damson flex gap-2">
            {file.kinds.map((kind) => (
              <span key={kind}>{kind}</span>
            ))}
          </span>
        </li>
      ))}
    </ul>
  );
}
