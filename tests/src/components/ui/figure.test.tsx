import { render } from '@testing-library/react';
import { describe, expect, it } from 'vitest';
import { Figure } from '../../../../src/components/ui/figure';
import { splitFigure } from '../../../../src/components/ui/split-figure';

describe('figures of a column', () => {
  it.each([
    ['0.0401', ['0', '.0401']],
    ['\u221212.5', ['\u221212', '.5']],
    ['377', ['377', '']],
    ['6\u202F412', ['6\u202F412', '']],
    ['0,367', ['0', ',367']],
  ])('parts %s at its decimal sign', (text, parts) => {
    expect(splitFigure(text)).toEqual(parts);
  });

  it('sets both parts into a grid of their own and loses no sign', () => {
    const { container } = render(<Figure>1.276</Figure>);
    const [whole, fraction] = container.querySelectorAll('.figure > span');
    expect(whole).toHaveTextContent('1');
    expect(fraction).toHaveTextContent('.276');
    expect(container).toHaveTextContent('1.276');
  });
});
