import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import { screen } from '@testing-library/react';
import { renderPart } from '../../testing/render-part';
import { Welcome } from './welcome';

const page = new DOMParser().parseFromString(
  readFileSync(join(__dirname, '../../../index.html'), 'utf8'),
  'text/html',
);
const wordsOf = (element: Element | null | undefined) => element?.textContent?.replace(/\s+/g, ' ').trim();

it('says word for word what index.html has painted before any script came', () => {
  renderPart(<Welcome />);
  const painted = page.querySelector('.first')!;
  const heading = screen.getByRole('heading', { level: 1 });
  expect(wordsOf(painted.querySelector('h1'))).toBe(wordsOf(heading));
  expect(wordsOf(painted.querySelector('p'))).toBe(wordsOf(heading.nextElementSibling));
  const doors = [...painted.querySelectorAll('a')].map((door) => [wordsOf(door), door.getAttribute('href')]);
  expect(doors).toEqual([
    ['Something is wrong', '/stop'],
    ['Sign in', '/sign-in'],
    ['Make an account', '/sign-up'],
  ]);
  for (const [name, href] of doors)
    expect(screen.getByRole('link', { name: name! })).toHaveAttribute('href', href);
});
