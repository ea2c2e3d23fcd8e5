/**
 * The one registry of standards, books and reports that formulas, tables and checks refer to.
 * `isFromMemory` marks what was recalled and could not be read while this was written; it is shown
 * to the reader wherever the source is cited.
 */
export interface Source {
  id: string
  citation: string
  edition: string
  /** Clauses, equations or tables used here. */
  clauses: string
  isFromMemory: boolean
}

export const SOURCE_REGISTRY = [
  {
    id: 'lame',
    citation: 'G. Lamé, thick-walled cylinder theory, as in any text on strength of materials',
    edition: 'common practice',
    clauses: 'radial and tangential stress of a thick ring under internal and external pressure',
    isFromMemory: true,
  },
  {
    id: 'timoshenko-2',
    citation: 'S. Timoshenko, Strength of Materials, Part II: Advanced Theory and Problems',
    edition: '3rd edition, 1956',
    clauses: 'shrink-fit stresses in compound cylinders; rotating disks of uniform thickness',
    isFromMemory: true,
  },
  {
    id: 'shigley-9',
    citation: "R. G. Budynas, J. K. Nisbett, Shigley's Mechanical Engineering Design",
    edition: '9th edition, 2011',
    clauses:
      'Eqs. 3-56 to 3-60, 6-18 to 6-33, 7-5 to 7-16, 7-39 to 7-49, Tables 6-2, 6-5, 7-2, sections 7-4 and 7-6',
    isFromMemory: false,
  },
  {
    id: 'brown-marks',
    citation: "T. H. Brown Jr., Marks' Calculations for Machine Design, McGraw-Hill",
    edition: '2005',
    clauses: 'section 3.2, Eqs. 3.11 to 3.15, Example 6 (p. 136); Eqs. 3.41 to 3.47',
    isFromMemory: false,
  },
  {
    id: 'mott',
    citation: 'R. L. Mott, Machine Elements in Mechanical Design',
    edition: 'example on stresses for force fits, class FN3',
    clauses: 'bronze bushing 2.000/2.500 in in a 3.500 in steel sleeve',
    isFromMemory: true,
  },
  {
    id: 'ugural',
    citation: 'A. C. Ugural, Mechanical Design of Machine Components',
    edition: '2nd edition',
    clauses: 'example on designing a press fit',
    isFromMemory: true,
  },
  {
    id: 'ugural-fenster',
    citation: 'A. C. Ugural, S. K. Fenster, Advanced Mechanics of Materials and Applied Elasticity',
    edition: 'problem on a flat disk shrunk on a shaft',
    clauses: 'loosening speed, stress at rest and at speed',
    isFromMemory: false,
  },
  {
    id: 'singer-pytel',
    citation: 'F. L. Singer, A. Pytel, Strength of Materials',
    edition: '3rd edition',
    clauses: 'Problems 267 (thermal shrinking) and 302 (torsion)',
    isFromMemory: false,
  },
  {
    id: 'din-7190-1',
    citation:
      'DIN 7190-1, Interference fits: calculation and design rules for cylindrical self-locking joints',
    edition: '2017',
    clauses:
      'embedding loss, capacities, joining temperature, press-in speed; adhesion tables of 5.2 and 5.3',
    isFromMemory: true,
  },
  {
    id: 'iso-286-1',
    citation: 'ISO 286-1, Geometrical product specifications: ISO code system for tolerances on linear sizes',
    edition: '2010 (values to 500 mm unchanged from 1988)',
    clauses: 'standard tolerance grades, fundamental deviations, delta rule',
    isFromMemory: true,
  },
  {
    id: 'narayana',
    citation: 'K. L. Narayana, P. Kannaiah, K. Venkata Reddy, Machine Drawing, New Age International',
    edition: '3rd edition',
    clauses: 'Tables 15.1 to 15.4: tolerance grades and fundamental deviations to 500 mm',
    isFromMemory: false,
  },
  {
    id: 'machinerys-handbook',
    citation: "Machinery's Handbook, Industrial Press",
    edition: '31st edition',
    clauses: 'Table 6a (BS 4500 fundamental deviations), pressure factors of forced fits',
    isFromMemory: false,
  },
  {
    id: 'jis-b-0401',
    citation: 'JIS B 0401, limit deviations for commonly used shafts',
    edition: '1999, as reprinted in a technical catalogue section',
    clauses: 'shafts b9 to x6, sizes to 80 mm',
    isFromMemory: false,
  },
  {
    id: 'din-743',
    citation: 'DIN 743, Load capacity of shafts and axles',
    edition: '2012',
    clauses: 'part 2: notch factors of interference-fit seats at 40 mm',
    isFromMemory: true,
  },
  {
    id: 'horger-maulbetsch',
    citation: 'O. J. Horger, J. L. Maulbetsch, J. Appl. Mech. 3 (1936) A91',
    edition: '1936',
    clauses: 'press-fitted members cut the bending fatigue strength of 2 in axles to one half to one third',
    isFromMemory: false,
  },
  {
    id: 'norton',
    citation: 'R. L. Norton, Machine Design, Appendix E',
    edition: 'Figs. E-2 and E-3',
    clauses:
      'power-law fits of shoulder stress concentration; rows D/d 1.5 (bending) and 1.33, 2 (torsion) read',
    isFromMemory: true,
  },
  {
    id: 'gere',
    citation: 'J. M. Gere, Mechanics of Materials',
    edition: 'example on nonprismatic beams',
    clauses: 'simply supported beam with a stiffer middle half',
    isFromMemory: true,
  },
  {
    id: 'beam-theory',
    citation: 'Euler-Bernoulli beam theory with cubic finite elements, as in any text on the method',
    edition: 'common practice',
    clauses: 'stiffness and consistent mass matrices of the two-node beam element',
    isFromMemory: true,
  },
  {
    id: 'vibration-theory',
    citation: 'Natural frequencies of discrete systems by Sturm sequences, as in any text on vibration',
    edition: 'common practice',
    clauses: 'number of negative pivots of K − λM equals the number of natural frequencies below',
    isFromMemory: true,
  },
  {
    id: 'statics',
    citation: 'Equilibrium of forces and moments on a rigid body',
    edition: 'common practice',
    clauses: 'section forces of a shaft cut at a station',
    isFromMemory: true,
  },
  {
    id: 'assembly-practice',
    citation: 'Assembly of shrunk parts on stepped shafts',
    edition: 'common practice',
    clauses: 'a part passes what is smaller than its bore; an inner part goes on before an outer one',
    isFromMemory: true,
  },
  {
    id: 'skf-mounting',
    citation: 'SKF rolling bearings, mounting instructions and fit tables',
    edition: 'catalogue pages',
    clauses: 'inner ring 80 to 90 K above the shaft; limits of shafts and housings',
    isFromMemory: false,
  },
  {
    id: 'fe-press-fit',
    citation:
      'Axisymmetric finite-element study of press fits with contact (CalculiX 2.20, checked by a second solver)',
    edition: 'project reference data',
    clauses: 'mean and mid-plane pressure, bore hoop stress, ten configurations',
    isFromMemory: false,
  },
  {
    id: 'beam-reference',
    citation: 'Numerical beam reference: Runge-Kutta integration, force method, dynamic stiffness (scipy)',
    edition: 'project reference data',
    clauses: 'statics, torsion and natural frequencies of stepped shafts',
    isFromMemory: false,
  },
  {
    id: 'finite-elements',
    citation: 'Linear finite-element method for axisymmetric solids, as in any text on the method',
    edition: 'common practice',
    clauses: 'four-node ring element, thermal and centrifugal nodal forces, unit load superposition',
    isFromMemory: true,
  },
  {
    id: 'hughes-b-bar',
    citation:
      'T. J. R. Hughes, Generalization of selective integration procedures to anisotropic and nonlinear media, Int. J. Numer. Meth. Engng 15 (1980)',
    edition: '1980',
    clauses: 'mean dilatation (B-bar) four-node element',
    isFromMemory: true,
  },
  {
    id: 'george-liu-envelope',
    citation: 'A. George, J. W. H. Liu, Computer Solution of Large Sparse Positive Definite Systems',
    edition: '1981',
    clauses: 'chapter 4: envelope methods',
    isFromMemory: true,
  },
  {
    id: 'kikuchi-oden',
    citation: 'N. Kikuchi, J. T. Oden, Contact Problems in Elasticity, SIAM',
    edition: '1988',
    clauses: 'unilateral contact as complementarity; Coulomb friction under proportional loading',
    isFromMemory: true,
  },
  {
    id: 'belt-friction',
    citation:
      'Rope friction (Euler-Eytelwein) and shaft loads of belts and chains, as in any text on machine design',
    edition: 'common practice',
    clauses: 'ratio of strand forces; factors of shaft load over effective pull',
    isFromMemory: true,
  },
  {
    id: 'machine-dynamics',
    citation: 'Cam followers and unbalance, as in any text on machine dynamics',
    edition: 'common practice',
    clauses: 'inertia, spring and energy balance of a cam follower; centrifugal force of an unbalance',
    isFromMemory: true,
  },
  {
    id: 'iso-80000-3',
    citation: 'ISO 80000-3, Quantities and units: space and time',
    edition: '2019',
    clauses: 'standard acceleration of free fall',
    isFromMemory: true,
  },
  {
    id: 'blackman-vigna',
    citation: 'D. Blackman, S. Vigna, Scrambled linear pseudorandom number generators',
    edition: '2021',
    clauses: 'xoshiro128**',
    isFromMemory: true,
  },
  {
    id: 'cody-erf',
    citation: 'W. J. Cody, Rational Chebyshev approximations for the error function, Math. Comp. 23 (1969)',
    edition: '1969',
    clauses: 'coefficients of erf and erfc in three ranges',
    isFromMemory: true,
  },
  {
    id: 'wichura-as241',
    citation:
      'M. J. Wichura, Algorithm AS 241: the percentage points of the normal distribution, Appl. Statist. 37 (1988)',
    edition: '1988',
    clauses: 'PPND16',
    isFromMemory: true,
  },
  {
    id: 'abramowitz-stegun',
    citation: 'M. Abramowitz, I. A. Stegun, Handbook of Mathematical Functions',
    edition: '1964',
    clauses: 'Table 26.1: normal probability function',
    isFromMemory: true,
  },
  {
    id: 'monte-carlo',
    citation: 'Simulation of tolerance chains, as in any text on statistics',
    edition: 'common practice',
    clauses: 'truncated normal sizes after inspection; squared correlation as share of the variance',
    isFromMemory: true,
  },
  {
    id: 'seat-equilibrium',
    citation: 'Equilibrium of a rigid hub on its seat with a cosine pressure round the circumference',
    edition: 'derived here',
    clauses: 'F_r = ∫ p₀ cos²t (D/2) L dt and the moment of a pressure linear along the seat',
    isFromMemory: false,
  },
  {
    id: 'heat-transfer',
    citation: 'Lumped-capacity cooling by convection, radiation and contact, as in any text on heat transfer',
    edition: 'common practice',
    clauses: 'Newton cooling, Stefan-Boltzmann law, thermal contact conductance',
    isFromMemory: true,
  },
  {
    id: 'rotor-dynamics',
    citation: 'Gyroscopic whirl of rotors on isotropic bearings, as in any text on rotor dynamics',
    edition: 'common practice',
    clauses: 'K ± ωΩG − ω²M, synchronous unbalance response, de Laval (Jeffcott) rotor',
    isFromMemory: true,
  },
  {
    id: 'iso-286-2-cor',
    citation: 'ISO 286-2:1988, Technical Corrigendum 1',
    edition: '2006',
    clauses: 'corrected limits of A13 and E8',
    isFromMemory: false,
  },
  {
    id: 'ansi-b4-2',
    citation: "ANSI B4.2, Preferred metric limits and fits, as tabulated in Machinery's Handbook",
    edition: '1978',
    clauses: 'limits of preferred shafts and holes',
    isFromMemory: true,
  },
  {
    id: 'nist-sp-811',
    citation: 'NIST Special Publication 811, Guide for the Use of the International System of Units',
    edition: '2008',
    clauses: 'Appendix B: conversion factors',
    isFromMemory: true,
  },
] as const satisfies readonly Source[]

export type SourceId = (typeof SOURCE_REGISTRY)[number]['id']

const sourcesById: ReadonlyMap<string, Source> = new Map(SOURCE_REGISTRY.map((source) => [source.id, source]))

export function findSource(id: SourceId): Source {
  const source = sourcesById.get(id)
  if (!source) throw new RangeError(`No source is registered under ${id}`)
  return source
}
