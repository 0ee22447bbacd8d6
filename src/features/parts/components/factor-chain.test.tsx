import { renderToStaticMarkup } from 'react-dom/server';
import { describe, expect, it } from 'vitest';
import type { FactorChain } from '../lib/factor-chain';
import { FactorChainLine } from './factor-chain';
import { ParasiticLine } from './parasitic-line';

const chain: FactorChain = {
  start: '10 µF',
  terms: [
    { kind: 'bias', name: 'bias', text: '0.5', estimated: true, basis: '2 V, by V/V rated and case' },
    { kind: 'tolerance', name: 'tolerance', text: '0.9', estimated: false, basis: 'letter K, low end' },
  ],
  result: '4.50 µF',
};

describe('the chain of factors on the page', () => {
  it('says at each factor whether it is estimated, and at the result when any is', () => {
    const page = renderToStaticMarkup(<FactorChainLine chain={chain} estimated />);
    expect(page.match(/≈ estimated/g)).toHaveLength(2);
    expect(page).toContain('by V/V rated and case');
    expect(page).toContain('4.50 µF');
    const known = { ...chain, terms: chain.terms.map((term) => ({ ...term, estimated: false })) };
    expect(renderToStaticMarkup(<FactorChainLine chain={known} estimated={false} />)).not.toContain('≈');
  });

  it('is read out in one sentence', () => {
    expect(renderToStaticMarkup(<FactorChainLine chain={chain} estimated />)).toContain(
      '10 µF × bias ≈ 0.5 × tolerance 0.9 = 4.50 µF',
    );
  });
});

describe('the line of ESR or ESL', () => {
  const line = (factor: number, estimated: boolean) =>
    renderToStaticMarkup(
      <ParasiticLine
        name="ESR"
        unit="Ω"
        catalogue={0.006}
        factor={factor}
        result={0.006 * factor}
        spread={{ text: '±30 %, the usual', estimated }}
      />,
    ).replace(/<[^>]+>/g, '');

  it('shows the end of the tolerance, marked where it is the usual one', () => {
    expect(line(1.3, true)).toBe(
      'ESR 6.00\u00a0mΩ × tolerance 1.3 = 7.80\u00a0mΩ ≈ estimated, ±30 %, the usual',
    );
    expect(line(1.3, false)).not.toContain('≈');
  });

  it('is left out in the middle of the tolerance', () => {
    expect(line(1, true)).toBe('');
  });
});
