import { Fragment, type ReactNode } from 'react';

const SUBSCRIPTS = '₀₁₂₃₄₅₆₇₈₉';
const SUPERSCRIPTS = '⁰¹²³⁴⁵⁶⁷⁸⁹';

/**
 * Chemistry and units written with Unicode sub- and superscripts, set as real ones: the text faces have no glyphs for
 * most of them, and a screen reader reads the plain digits.
 */
export function Formula({ children }: { children: string }): ReactNode {
  const parts: ReactNode[] = [];
  let run = '';
  let kind: 'plain' | 'sub' | 'sup' = 'plain';
  const close = () => {
    if (run === '') return;
    const key = parts.length;
    if (kind === 'sub') parts.push(<sub key={key}>{run}</sub>);
    else if (kind === 'sup') parts.push(<sup key={key}>{run}</sup>);
    else parts.push(<Fragment key={key}>{run}</Fragment>);
    run = '';
  };
  for (const character of children) {
    const [nextKind, text] = read(character);
    if (nextKind !== kind) {
      close();
      kind = nextKind;
    }
    run += text;
  }
  close();
  return <>{parts}</>;
}

function read(character: string): ['plain' | 'sub' | 'sup', string] {
  const sub = SUBSCRIPTS.indexOf(character);
  if (sub >= 0) return ['sub', String(sub)];
  const sup = SUPERSCRIPTS.indexOf(character);
  if (sup >= 0) return ['sup', String(sup)];
  if (character === '⁺') return ['sup', '+'];
  if (character === '⁻') return ['sup', '−'];
  return ['plain', character];
}
