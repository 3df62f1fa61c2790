import { fireEvent, render, screen } from '@testing-library/react';
import { describe, expect, it } from 'vitest';
import { inches } from '#shared/model/length';
import { PrintPicture } from '@/components/print-picture';
import { printAngle } from '@/lib/print-angle';
import { buildPrint, printIdOf } from '../../support/builders';

describe('a print as a piece of paper', () => {
  it('shows of the file what the paper shows', () => {
    const print = buildPrint({ imageWidth: 600, imageHeight: 400, paperRect: { x: 150, y: 0, width: 300, height: 400 }, paperWidth: inches(3), paperHeight: inches(4) });
    render(<PrintPicture print={print} />);
    expect(screen.getByRole('img', { name: print.title })).toHaveStyle({ left: '-50%', top: '0%', width: '200%', height: '100%' });
  });

  it('lies turned by quarter-turns inside its upright paper', () => {
    render(<PrintPicture print={buildPrint({ turns: 1, paperWidth: inches(4), paperHeight: inches(6), imageWidth: 600, imageHeight: 400 })} />);
    expect(screen.getByRole('img').parentElement).toHaveStyle({ width: '150%', height: '66.66666666666666%', transform: 'translate(-50%, -50%) rotate(90deg)' });
  });

  it('says whether its picture is on the way, there or missing', () => {
    const { container } = render(<PrintPicture print={buildPrint()} />);
    const paper = container.querySelector('.print')!;
    expect(paper).toHaveAttribute('data-state', 'loading');
    fireEvent.load(screen.getByRole('img'));
    expect(paper).toHaveAttribute('data-state', 'shown');
    fireEvent.error(container.querySelector('img')!);
    expect(paper).toHaveAttribute('data-state', 'missing');
  });
});

describe('how a print lies on the table', () => {
  it('follows from its id and is never more than 1.4 degrees', () => {
    const angles = Array.from({ length: 200 }, (_, i) => printAngle(printIdOf(i)));
    expect(angles.every((angle) => Math.abs(angle) <= 1.4)).toBe(true);
    expect(printAngle(printIdOf(7))).toBe(angles[7]);
    expect(new Set(angles).size).toBeGreaterThan(10);
  });
});
