import type { Formula } from './_formula.ts';

const theory = 'Circuit theory.';

/** The formulas of exact parts, all on one list so that their numbers are seen to run on. */
export const formulas: readonly Formula[] = [
  {
    number: 'B1',
    title: 'Aim and reflection coefficient',
    lines: ['Z_T = Z_S^*  ,  Γ = frac(Z_in − Z_S^*; Z_in + Z_S)', 'Z_T = Z_S  ,  Γ = frac(Z_in − Z_S; Z_in + Z_S)'],
    text: [
      'First line: conjugate aim, all the available power is taken. Second line: reflectionless aim, no wave returns on a line of impedance Z_S. With a real source both are the same. The aim in force is stated as an assumption in every report.',
    ],
    symbols: [
      ['Z_S = R_S + jX_S', 'source impedance', 'Ω', 'R_S from 1 µΩ to 1 GΩ, X_S from −1 GΩ to 1 GΩ'],
      ['Z_in', 'impedance seen from the source into the network', 'Ω', ''],
      ['Z_T', 'impedance to be seen', 'Ω', ''],
      ['Γ', 'reflection coefficient for the aim in force', '1', '0 ≤ |Γ| ≤ 1'],
    ],
    source:
      'K. Kurokawa, IEEE Trans. Microwave Theory Tech. 13, 1965 (power waves), for the conjugate aim; wave theory of lines for the other.',
  },
  {
    number: 'B2',
    title: 'Terminations away from the design frequency',
    lines: [
      'L = frac(X; ω_0) for X > 0  ,  C = − frac(1; ω_0 X) for X < 0',
      'C = frac(B; ω_0) for B > 0  ,  L = − frac(1; ω_0 B) for B < 0',
    ],
    text: [
      'Series (default): R stays, X is the inductance or capacitance of the first line. Parallel: 1/G stays, B = Im(1/Z) is the capacitance or inductance of the second line. Constant: R + jX at every frequency. Which of them holds is an assumption and is listed as one for each end.',
    ],
    symbols: [
      ['ω_0 = 2πf_0', 'angular design frequency', 'rad/s', 'f_0 from 1 Hz to 1 THz'],
      ['X, B', 'reactance and susceptance at f_0', 'Ω, S', ''],
    ],
    source: theory,
  },
  {
    number: 'B3',
    title: 'Two elements, shunt arm at the load',
    lines: ['B = − B_L ± sqrt(frac(G_L; R_T) − G_L^2)', 'X = X_T − Im frac(1; G_L + j(B + B_L))'],
    text: [
      'From the source: series arm X, then shunt arm B. Exists if and only if R_T ≤ 1/G_L; where it does not, the sheet prints the inequality with its numbers. Both signs of the root are listed; a double root counts once; an arm of no reactance or susceptance is left out.',
    ],
    symbols: [
      ['Y_L = G_L + jB_L', 'load admittance, 1/Z_L', 'S', 'R_L from 1 µΩ to 1 GΩ'],
      ['R_T, X_T', 'resistance and reactance to be seen', 'Ω', ''],
      ['X, B', 'series and shunt arm', 'Ω, S', ''],
    ],
    source: 'Circuit theory; cf. G. Gonzalez, Microwave Transistor Amplifiers, 2nd ed., 1997, ch. 2.',
  },
  {
    number: 'B4',
    title: 'Two elements, shunt arm at the source',
    lines: ['X = − X_L ± sqrt(frac(R_L; G_T) − R_L^2)', 'B = B_T − Im frac(1; R_L + j(X + X_L))'],
    text: ['From the source: shunt arm B, then series arm X. The dual of B3. Exists if and only if R_L ≤ 1/G_T.'],
    symbols: [
      ['Y_T = G_T + jB_T', 'admittance to be seen, 1/Z_T', 'S', ''],
      ['R_L, X_L', 'load resistance and reactance', 'Ω', ''],
    ],
    source: 'As B3.',
  },
  {
    number: 'B5',
    title: 'From arms to parts',
    lines: [
      'L = frac(X; ω_0) for X > 0  ,  C = − frac(1; ω_0 X) for X < 0',
      'C = frac(B; ω_0) for B > 0  ,  L = − frac(1; ω_0 B) for B < 0',
    ],
    text: ['Exact values. Rounding to values on sale is a step of its own, not taken here.'],
    symbols: [
      ['L', 'inductance', 'H', 'practicable: as given, 1 nH to 10 µH by default'],
      ['C', 'capacitance', 'F', 'practicable: as given, 1 pF to 100 nF by default'],
    ],
    source: theory,
  },
  {
    number: 'B6',
    title: 'Resistive pair by the Q method',
    lines: ['Q = sqrt(frac(R_high; R_low) − 1)', 'X_series = ± Q R_low  ,  X_shunt = ∓ frac(R_high; Q)'],
    text: [
      'The shunt arm stands across the higher resistance. Equal resistances need no part. Element values must agree with B3 and B4 to 1 part in 10¹².',
    ],
    symbols: [['R_high, R_low', 'the higher and the lower of the two resistances', 'Ω', '']],
    source: 'Common practice; e.g. C. Bowick, RF Circuit Design, 1982, ch. 4.',
  },
  {
    number: 'B7',
    title: 'Sections in cascade',
    lines: ['R_k = R_low^{1−k/n} R_high^{k/n}  ,  k = 0 … n', 'Q = sqrt((frac(R_high; R_low))^{1/n} − 1)'],
    text: [
      'Every section is the network of B6 between two neighbouring resistances, so that all have the same Q; all low-pass (series L, shunt C) or all high-pass (series C, shunt L). R_low is the series resistance of the end with a series arm, R_high the parallel resistance of the other end. Reactance at the ends is absorbed by the outer arm or, being of the other sign, resonated in it.',
      'The smallest number is the least n, 1 to 6, of which a form holds the return loss over the band.',
    ],
    symbols: [
      ['n', 'number of sections', '1', '1 to 6'],
      ['R_k', 'resistance between sections k and k + 1', 'Ω', ''],
    ],
    source: 'Common practice; e.g. C. Bowick, RF Circuit Design, 1982, ch. 4.',
  },
  {
    number: 'B8',
    title: 'Impedance seen',
    lines: ['V ← V + Z_arm I  ,  I ← I + Y_arm V  ,  Z_in = frac(V; I)'],
    text: [
      'From V = Z_L, I = 1 at the load, arm by arm towards the source: the first step for a series arm, the second for a shunt arm. The response, the worst return loss and the half-power edges come from it.',
    ],
    symbols: [
      ['V, I', 'voltage and current at the port, for 1 A into the load', 'V, A', ''],
      ['Z_arm, Y_arm', 'impedance of a series arm, admittance of a shunt arm', 'Ω, S', ''],
    ],
    source: theory,
  },
  {
    number: 'B9',
    title: 'Transducer gain',
    lines: ['G_T = frac(4 R_S R_L; |V + I Z_S|^2)'],
    text: [
      'Power in the load over the available power of the source. With lossless parts and the conjugate aim, G_T = 1 − |Γ|² of B1.',
    ],
    symbols: [['G_T', 'transducer gain', '1', '0 to 1']],
    source: 'D. M. Pozar, Microwave Engineering, 4th ed., 2012, ch. 12.',
  },
  {
    number: 'B10',
    title: 'Return loss, VSWR, mismatch loss',
    lines: ['R = − 20 log10 |Γ|', 'S = frac(1 + |Γ|; 1 − |Γ|)', 'M = − 10 log10 (1 − |Γ|^2)'],
    text: [
      'Return loss is positive; larger is better. It is compared with the requirement at its least value in the band: 101 frequencies in equal ratios, both ends included, every maximum of |Γ| between them refined by golden section. Figures stop at 200 dB and at a VSWR of 10⁶.',
    ],
    symbols: [
      ['R', 'return loss', 'dB', '0 to 200'],
      ['S', 'voltage standing wave ratio', '1', '1 to 10⁶'],
      ['M', 'mismatch loss', 'dB', '0 to 200'],
    ],
    source: 'D. M. Pozar, Microwave Engineering, 4th ed., 2012, ch. 2.',
  },
  {
    number: 'B11',
    title: 'Half-power bandwidth from the loaded Q',
    lines: ['Q_L = frac(Q; 2)  ,  b = frac(f_0; Q_L)'],
    text: [
      'An estimate, printed beside B12. Where the two differ by more than 10 %, the sheet says that the estimate does not hold, and why.',
    ],
    symbols: [
      ['Q', 'of one section between its two resistances, B6 or B7', '1', ''],
      ['b', 'half-power bandwidth', 'Hz', ''],
    ],
    source: 'Common practice; e.g. C. Bowick, RF Circuit Design, 1982, ch. 4.',
  },
  {
    number: 'B12',
    title: 'Half-power bandwidth from the sweep',
    lines: ['G_T(f) = frac(1; 2) G_T(f_peak)'],
    text: [
      'The two frequencies next to the peak nearest f_0 at which transducer gain has fallen by 3.0103 dB, looked for from 10⁻⁶ f_0 to 10⁶ f_0. An edge that isn’t there is reported as absent.',
    ],
    symbols: [['f_peak', 'frequency of the peak', 'Hz', '']],
    source: theory,
  },
  {
    number: 'B13',
    title: 'Attenuation at the harmonics',
    lines: ['A_k = 10 log10 frac(G_T(f_0); G_T(k f_0))  ,  k = 2, 3'],
    text: ['Both terminations are taken to behave at the harmonics as stated by B2.'],
    symbols: [['A_k', 'attenuation at k times the design frequency; negative: more passes there', 'dB', 'at most 200']],
    source: theory,
  },
  {
    number: 'B14',
    title: 'Route of evidence: step by step',
    lines: ['Z ← Z + Z_arm  ,  frac(1; Z) ← frac(1; Z) + Y_arm', 'G_T = frac(4 R_S R_in; |Z_S + Z_in|^2)'],
    text: ['Impedances combined in series and in parallel from the load. The gain is that of a lossless network.'],
    symbols: [['R_in', 'real part of the impedance seen', 'Ω', '']],
    source: theory,
  },
  {
    number: 'B15',
    title: 'Route of evidence: S-parameters',
    lines: [
      'G_T = frac((1 − |Γ_S|^2) |S_21|^2 (1 − |Γ_L|^2); |D|^2)',
      'D = (1 − S_11 Γ_S)(1 − S_22 Γ_L) − S_12 S_21 Γ_S Γ_L',
    ],
    text: ['Scattering matrices of the arms in one real reference resistance, cascaded.'],
    symbols: [
      ['S_11, S_12, S_21, S_22', 'scattering parameters of the network', '1', ''],
      ['Γ_S, Γ_L', 'reflection coefficients of the terminations in the reference resistance', '1', ''],
    ],
    source: 'D. M. Pozar, Microwave Engineering, 4th ed., 2012, ch. 4 and 12.',
  },
  {
    number: 'B16',
    title: 'Route of evidence: nodal equations',
    lines: ['Y V = I', 'P_available = P_load + P_lost + P_reflected'],
    text: [
      'All node voltages solved at once; the power balance of the second line is checked on them. Routes must agree, at the design frequency and at both ends of the band, to 1 part in 10⁹ of the largest.',
    ],
    symbols: [
      ['Y', 'admittance matrix of network and terminations', 'S', ''],
      ['V, I', 'node voltages and source currents', 'V, A', ''],
      ['P', 'powers', 'W', ''],
    ],
    source: theory,
  },
  {
    number: 'B17',
    title: 'Digest of the record',
    lines: [],
    text: [
      'SHA-256 over the record in canonical form, without its sign-off, so that signing does not change it. The same inputs and decisions give the same digest; any other input gives another. A report prints it on every page.',
    ],
    symbols: [],
    source: 'FIPS 180-4; RFC 8785.',
  },
  {
    number: 'B18',
    title: 'Circuit models of a termination',
    lines: [
      'Z = R + j(ωL − frac(1; ωC))',
      'Y = frac(1; R) + j(ωC − frac(1; ωL))',
      'L = frac(QR; ω_r)  ,  C = frac(1; ω_r^2 L)',
    ],
    text: [
      'First line: rc-series, rl-series, rlc-series; an absent part adds nothing. Second line: rc-parallel, rl-parallel, rlc-parallel. crystal: R, L and C of the first line in series, C0 across them. antenna: the first line with L and C of the third, from its resonance and its Q there.',
    ],
    symbols: [
      ['R, L, C', 'parts of the model, as typed', 'Ω, H, F', 'above zero'],
      ['ω_r = 2πf_r', 'angular frequency of the resonance', 'rad/s', ''],
    ],
    source: theory,
  },
  {
    number: 'B19',
    title: 'Measured terminations',
    lines: ['Γ = frac(Z − Z_ref; Z + Z_ref)  ,  Z = Z_ref frac(1 + Γ; 1 − Γ)'],
    text: [
      'From a Touchstone file, version 1 or 2, one port of it, or a table of frequency, R and X. Real and imaginary part of Γ are interpolated over frequency by a piecewise cubic that rises and falls only as the samples do. Nothing is extrapolated: a frequency outside the data is refused, or said to be outside them. Of more than 2001 samples, 2001 evenly chosen ones are kept; the largest distance of any other from the curve is stated.',
    ],
    symbols: [['Z_ref', 'reference resistance of the file; of a table, 50 Ω', 'Ω', '']],
    source: 'F. N. Fritsch and J. Butland, SIAM J. Sci. Stat. Comput. 5, 1984; Touchstone, IBIS Open Forum.',
  },
  {
    number: 'B20',
    title: 'Ceiling',
    lines: [
      'w = frac(f_2 − f_1; sqrt(f_1 f_2))  ,  |Γ| = e^{−π/(Qw)}',
      '|Γ| = frac(cosh nb; cosh na)',
      'frac(tanh na; cosh a) = frac(tanh nb; cosh b)  ,  sinh a − sinh b = frac(2 sin(π/2n); Qw)',
    ],
    text: [
      'The best |Γ| that a lossless network of any kind can hold over the band: with any number of resonators (first line), with n of them, the end’s own counted (second and third). It holds for each reactive end by itself; the end and state of the largest Q governs. With one resonator |Γ|² = (√(1 + g²) − 1)/(√(1 + g²) + 1), g = Qw.',
      'There is none between two resistances, without a band, and for the reflectionless aim at a complex source, which is no question of power. Where a reactance is held constant, or a fitted model (B21) stands for the end, the figure is an estimate and is called one.',
    ],
    symbols: [
      [
        'Q',
        'of the end at the band’s centre: |X|/R in series, R/|X| in parallel, of the larger of two reactances',
        '1',
        '',
      ],
      ['w', 'fractional width of the band', '1', ''],
      ['n', 'number of resonators', '1', '1 to 6'],
    ],
    source:
      'H. W. Bode, Network Analysis and Feedback Amplifier Design, 1945; R. M. Fano, J. Franklin Institute 249, 1950.',
  },
  {
    number: 'B21',
    title: 'One-resonance model of an end',
    lines: ['X(f) = x_L frac(f; f_c) − x_C frac(f_c; f)'],
    text: [
      'For measured data and crystals: R and the two reactances by least squares over 41 frequencies of the band, in series and, in admittance, in parallel; the arrangement nearer in reflection is taken. Its Q is that of the larger reactance. The largest distance in Γ between model and data, in a reference of |Z|, is stated.',
    ],
    symbols: [
      ['x_L, x_C', 'the reactance that grows and the one that falls, at the centre', 'Ω', '0 or more'],
      ['f_c', 'centre of the band, square root of f_1 f_2', 'Hz', ''],
    ],
    source: theory,
  },
  {
    number: 'B22',
    title: 'Pi and T of a chosen Q',
    lines: [
      'R_v = frac(R_high; Q^2 + 1) < R_low',
      'R_v = R_low (Q^2 + 1) > R_high',
      'Q ≥ sqrt(frac(R_high; R_low) − 1)',
    ],
    text: [
      'Two sections of B6 back to back through a virtual resistance: Pi (first line) between the ends’ parallel resistances, T (second line) between their series resistances. Each section is low-pass or high-pass, so that there are four of either kind. Reactance of an end is taken into the outer arm next to it. They exist from the least Q of the third line upwards; where no Q is given, 1.5 times the least and at least 2 is taken.',
    ],
    symbols: [
      ['Q', 'at the steeper end', '1', 'as typed, or as above'],
      ['R_v', 'virtual resistance', 'Ω', ''],
    ],
    source: 'C. Bowick, RF Circuit Design, 1982, ch. 4.',
  },
  {
    number: 'B23',
    title: 'Equal ripple',
    lines: [
      'frac(P_available; P_load) = 1 + ε^2 T_n^2(x)  ,  x = frac(2ω^2 − ω_1^2 − ω_2^2; ω_2^2 − ω_1^2)',
      'ε = frac(r − 1; 2 sqrt(r)) frac(1; T_n(x_0))  ,  x_0 = frac(ω_1^2 + ω_2^2; ω_2^2 − ω_1^2)',
      '|Γ|^2 = frac(ε^2; 1 + ε^2)',
    ],
    text: [
      'Ladders of 2n elements between two resistances of ratio r, low-pass form; the high-pass form mirrors it about the band’s centre. Elements from the left-half-plane roots in closed form by continued fractions. The third line is the worst |Γ| in the band; beyond 150 dB double precision cannot bear it out, and the network is refused. Reactance of an end is absorbed where it is of the outer element’s kind and no larger.',
    ],
    symbols: [
      ['T_n', 'Chebyshev polynomial of degree n', '1', ''],
      ['n', 'number of sections', '1', '1 to 6'],
      ['ω_1, ω_2', 'angular frequencies of the band’s ends', 'rad/s', ''],
    ],
    source: 'G. L. Matthaei, Proc. IEEE 52, 1964.',
  },
  {
    number: 'B24',
    title: 'Fitted networks',
    lines: [],
    text: [
      'Ladders of 2 to 8 elements, arms in series and in shunt by turns: over every arrangement of inductors and capacitors that the form, the DC requirements and the choice about shunt inductors leave, the largest |Γ| over band and load states is lowered, element values kept inside the practicable ranges. Starts: random ones from a seed (1 by default), networks matched at the centre, closed forms and smaller fitted networks. A wide band is followed to a narrow one where the ends call for it. The same record gives the same networks; a search that was stopped is recorded with its number of steps. It is a search: a better network may exist, and the distance from the ceiling (B20) tells how much better at most.',
    ],
    symbols: [],
    source: 'J. Nocedal and S. J. Wright, Numerical Optimization, 2nd ed., Springer 2006, ch. 6.',
  },
  {
    number: 'B25',
    title: 'Loss in the parts',
    lines: ['R_ser = frac(ω_0 L; Q_ind)  ,  R_ser = frac(1; ω_0 C Q_cap)', 'A = 10 log10 frac(P_in; P_load)'],
    text: [
      'At the design frequency alone, each part with the series resistance that its quality factor means. Figures with real parts are of B26 and on.',
    ],
    symbols: [
      ['Q_ind', 'of inductors', '1', '50 by default'],
      ['Q_cap', 'of capacitors', '1', '300 by default'],
      ['A', 'loss', 'dB', ''],
    ],
    source: theory,
  },
];
