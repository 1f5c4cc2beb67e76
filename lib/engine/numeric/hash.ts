/** FNV-1a, 64 bit, over UTF-16 code units taken low byte first; 16 hexadecimal digits. (Fowler, Noll, Vo; RFC 9923.) */
export function fnv1a64(text: string): string {
  const prime = 0x100000001b3n;
  let hash = 0xcbf29ce484222325n;
  for (let i = 0; i < text.length; i++) {
    const unit = text.charCodeAt(i);
    hash = BigInt.asUintN(64, (hash ^ BigInt(unit & 0xff)) * prime);
    hash = BigInt.asUintN(64, (hash ^ BigInt(unit >> 8)) * prime);
  }
  return hash.toString(16).padStart(16, '0');
}
