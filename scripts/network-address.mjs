/**
 * The network a request comes from, as budgets count it: an IPv4 address whole, an IPv6 address by its first 64 bits,
 * which are one line's own however many addresses it uses (RFC 4291, section 2.5.4). What is no address stays as it is.
 * @param {string} address
 * @returns {string}
 */
export function readNetwork(address) {
  const bare = address.replace(/^\[|\]$/g, '').replace(/%.*$/, '');
  const mapped = /^::ffff:(\d+\.\d+\.\d+\.\d+)$/i.exec(bare);
  if (mapped?.[1] !== undefined) return mapped[1];
  if (!bare.includes(':') || !URL.canParse(`http://[${bare}]`)) return bare;
  const [head = '', tail] = new URL(`http://[${bare}]`).hostname.slice(1, -1).split('::');
  const first = head === '' ? [] : head.split(':');
  const last = tail === undefined || tail === '' ? [] : tail.split(':');
  const gap = tail === undefined ? 0 : 8 - first.length - last.length;
  const groups = [...first, ...Array.from({ length: gap }, () => '0'), ...last];
  return `${groups.slice(0, 4).join(':')}::/64`;
}
