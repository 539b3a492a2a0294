/** Invented small tables of the tile works. */
export const long = `kiln,density (g/cm3)
east,2.31
east,2.35
east,2.29
east,2.34
east,2.33
west,2.27
west,2.30
west,2.24
west,2.28
west,2.26
`;

export const wide = `east (g/cm3),west (g/cm3)
2.31,2.27
2.35,2.30
2.29,2.24
2.34,2.28
2.33,2.26
2.36,
`;

export const outcomes = `kiln,crazed
${'east,yes\n'.repeat(7)}${'east,no\n'.repeat(33)}${'west,yes\n'.repeat(15)}${'west,no\n'.repeat(25)}`;
