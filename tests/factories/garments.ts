import type { Garment } from '@/lib/domain/roster/player';

const size = (code: string, label: string) => ({ code, label });

/** A shirt and shorts in youth and adult sizes, as a small league offers them. */
export const garments: Garment[] = [
  {
    code: 'home-shirt',
    name: 'Home shirt',
    worn: 'home',
    numbered: true,
    named: true,
    sizes: [
      size('YS', 'Youth small'),
      size('YM', 'Youth medium'),
      size('YL', 'Youth large'),
      size('S', 'Small'),
      size('M', 'Medium'),
      size('L', 'Large'),
      size('2XL', 'Extra extra large'),
    ],
  },
  {
    code: 'shorts',
    name: 'Shorts',
    worn: 'home and away',
    numbered: false,
    named: false,
    sizes: [
      size('YM', 'Youth medium'),
      size('M', 'Medium'),
      size('9-10', 'Age 9–10'),
      size('11-12', 'Age 11–12'),
    ],
  },
];
