/** Where the constants come from. Keys are cited by every row of the table. */
export const SOURCES = {
  plummerBusenberg1982: 'Plummer & Busenberg 1982, Geochim. Cosmochim. Acta 46, 1011',
  nordstrom1990: 'Nordstrom et al. 1990, ACS Symp. Ser. 416, ch. 31',
  batesAcree1943: 'Bates & Acree 1943, J. Res. NBS 30, 129',
  bates1951: 'Bates 1951, J. Res. NBS 47, 127; NIST 46',
  morris1966: 'Morris 1966, J. Phys. Chem. 70, 3798',
  busenberg1984: 'Busenberg, Plummer & Parker 1984, Geochim. Cosmochim. Acta 48, 2021',
  busenberg1986: 'Busenberg & Plummer 1986, Geochim. Cosmochim. Acta 50, 2225',
  mcDowell1977: 'McDowell, Gregory & Brown 1977, J. Res. NBS 81A, 273',
  gregory1970: 'Gregory, Moreno & Brown 1970, J. Res. NBS 74A, 461',
  ohlinger1998: 'Ohlinger, Young & Schroeder 1998, Water Res. 32, 3607',
  hullTurnbull1973: 'Hull & Turnbull 1973, Geochim. Cosmochim. Acta 37, 685',
  schock: 'Schock 1980, 1989, 1996: lead set used in the corrosion literature',
  epaCopper1995: 'Schock, Lytle & Clement 1995, EPA/600/R-95/085',
  ballNordstrom1991: 'Ball & Nordstrom 1991, USGS OFR 91-183',
  smithMartell: 'Smith & Martell, Critical Stability Constants; NIST 46',
  stummMorgan1996: 'Stumm & Morgan 1996, Aquatic Chemistry, 3rd ed.',
  truesdellJones1974: 'Truesdell & Jones 1974, J. Res. USGS 2, 233',
  kielland1937: 'Kielland 1937, J. Am. Chem. Soc. 59, 1675',
} as const;

export type SourceKey = keyof typeof SOURCES;
