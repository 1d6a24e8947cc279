import { render, screen } from '@testing-library/react';
import { describe, expect, it } from 'vitest';
import { VerdictWord } from './VerdictWord';

describe('VerdictWord', () => {
  it('says by how much a check fails', () => {
    render(<VerdictWord verdict="fails" value={1.17} limit={1.2} />);
    expect(screen.getByText('fails by 0.03')).toBeInTheDocument();
  });

  it('names the unit and never rounds a shortfall to nothing', () => {
    render(<VerdictWord verdict="marginal" value={0.1199} limit={0.12} unit="mm" />);
    expect(screen.getByText('marginal by less than 0.01 mm')).toBeInTheDocument();
  });

  it('stays one word where it passes or nothing is known', () => {
    render(<VerdictWord verdict="passes" value={1.5} limit={1.2} />);
    render(<VerdictWord verdict="fails" />);
    expect(screen.getByText('passes')).toBeInTheDocument();
    expect(screen.getByText('fails')).toBeInTheDocument();
  });
});
