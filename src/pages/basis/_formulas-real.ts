import type { Formula } from './_formula.ts';

const theory = 'Circuit theory.';

/** The formulas of real parts, whose numbers run on from those of exact ones. */
export const realFormulas: readonly Formula[] = [
  {
    number: 'B26',
    title: 'A real part',
    lines: [
      'Q(f) = Q_0 (f / f_0)^s',
      'Z_ind = frac(z; 1 + jωC_p z)  ,  z = frac(ωL; Q(f)) + jωL',
      'Z_cap = frac(1; ωC Q(f)) − frac(j; ωC) + jωL_ESL',
      'C_p = frac(1; (2πf_SR)^2 L)  ,  L_ESL = frac(1; (2πf_SR)^2 C)',
    ],
    text: [
      'L and C are the values at low frequency, as parts are sold. A shunt arm has the inductance of its leads in series; every node, the source’s and one after each series arm, has a stray capacitance to ground. The slope s is 0 by default: the Q is constant. What a stock line states of its part goes before the policy’s.',
    ],
    symbols: [
      ['Q_0', 'quality factor at the design frequency', '1', '50 for inductors, 300 for capacitors by default'],
      ['s', 'slope of the quality factor', '1', '−2 to 2'],
      ['f_SR', 'self-resonance', 'Hz', 'none by default'],
      ['L_ESL', 'equivalent series inductance', 'H', '0 by default'],
    ],
    source: theory,
  },
  {
    number: 'B27',
    title: 'Centring and choice of values',
    lines: ['min max |Γ(f, state)| for f_1 ≤ f ≤ f_2'],
    text: [
      'First without regard to what is on sale: the values that make the largest |Γ| over band and load states smallest, with loss and strays in (B26), from the exact ones. Then with parts on sale: every set of candidates where there are few enough, otherwise the sets about the centred values, and every set that differs from one of the best in two arms or in neighbouring arms, until none is better. Sets are judged together, never part by part. What rounding cost is the difference between both. Without a band the design frequency stands for it.',
    ],
    symbols: [],
    source: 'The search is a method of this work; it is compared with exhaustive searches in the tests.',
  },
  {
    number: 'B28',
    title: 'Preferred values and tolerances',
    lines: ['E_{n, i} = 10^{i/n} for n = 48, 96, 192'],
    text: [
      'E3 to E24 are the standard’s table, of two digits; E48, E96 and E192 the formula, rounded to three digits, but 9.20 where it gives 9.19. Tolerance letters: B, C, D are ±0.1, ±0.25, ±0.5 pF; F, G, J, K, M are ±1, ±2, ±5, ±10, ±20 %.',
    ],
    symbols: [],
    source: 'IEC 60063:2015; IEC 60062:2016.',
  },
  {
    number: 'B29',
    title: 'Two parts for one',
    lines: ['L = L_a + L_b  ,  C = C_a + C_b', 'L = frac(L_a L_b; L_a + L_b)  ,  C = frac(C_a C_b; C_a + C_b)'],
    text: [
      'Where the engineer allows it and no set of single parts meets what is required: pairs closer to the centred value than single parts are, in one arm if that is enough. Losses add by the share of voltage or current that each part takes; each varies within its own tolerance.',
    ],
    symbols: [],
    source: theory,
  },
  {
    number: 'B30',
    title: 'Efficiency and loss of real parts',
    lines: ['η = frac(P_load; P_load + P_parts)  ,  A = − 10 log10 η'],
    text: ['At the design frequency, in the state that governs; P_parts is the heat of B35 in all parts together.'],
    symbols: [
      ['η', 'efficiency of the network', '1', '0 to 1'],
      ['A', 'loss', 'dB', ''],
    ],
    source: theory,
  },
  {
    number: 'B31',
    title: 'Networks drawn from the tolerances',
    lines: ['x = x_0 (1 + t u)  ,  R = R_0 (1 + t u)  ,  X = X_0 + t u |Z_0|'],
    text: [
      'Each part by itself: u from −1 to 1, evenly, in a triangle, or normally with a standard deviation of one third, cut off at ±1. Source and load spread by the second and third formula, where a spread is given, the same at every frequency. Draws are numbered: the seed and its number make a network, so that the same record gives the same networks, in whatever order and by however many workers they are counted.',
    ],
    symbols: [
      ['t', 'tolerance as a fraction of the value', '1', '0 to below 1'],
      ['u', 'deviation drawn', '1', '−1 to 1'],
    ],
    source:
      'JCGM 101:2008; J. K. Salmon et al., Proc. SC 2011 (Philox4x32-10); M. J. Wichura, Applied Statistics 37, 1988, AS 241 (normal).',
  },
  {
    number: 'B32',
    title: 'Yield and its interval',
    lines: ['Y = frac(k; n)', 'I_{p_low}(k, n − k + 1) = 0.025  ,  I_{p_high}(k + 1, n − k) = 0.975'],
    text: [
      'k of n networks hold the return loss over band and states. The interval is exact: it holds the yield that very many networks would have with a confidence of at least 95 %. With k = 0 its lower end is 0, with k = n its upper end 1. It covers the chance of drawing, not what is assumed of the parts.',
    ],
    symbols: [['I_x(a, b)', 'regularised incomplete beta function', '1', '']],
    source: 'C. J. Clopper and E. S. Pearson, Biometrika 26, 1934.',
  },
  {
    number: 'B33',
    title: 'Spread over frequency',
    lines: [],
    text: [
      'At each frequency, the return loss below which 5, 50 and 95 % of the networks drawn (B31) lie: the smallest one drawn that at least so many do not exceed. The curves are not those of any one network.',
    ],
    symbols: [],
    source: 'JCGM 101:2008.',
  },
  {
    number: 'B34',
    title: 'Corners, sensitivity, tightening',
    lines: ['S = frac(RL(1.001 x) − RL(0.999 x); 0.2)'],
    text: [
      'Corners: every part at an end of its tolerance, all 2^n combinations for up to twelve parts; for more, each part at the end that is worse for it alone. Sensitivity: what one per cent of one part does to the worst return loss, and the worst return loss with that part alone at the worse end; ranked by the latter. Tightening: the yield of the same networks with one part’s tolerance halved.',
    ],
    symbols: [
      ['S', 'change of the worst return loss per cent of the value', 'dB/%', ''],
      ['RL', 'worst return loss over band and states', 'dB', '0 to 200'],
    ],
    source: theory,
  },
  {
    number: 'B35',
    title: 'Stress',
    lines: ['E_S = sqrt(8 R_S P_av)  ,  I_rms = frac(|I|; sqrt(2))  ,  P_part = frac(|I|^2; 2) Re Z_part'],
    text: [
      'Peak voltage across, RMS current through and heat in each part for all of the available power: each the most over band and load states, at the frequencies of the grid. Of two parts for one, each by its share. By both the carried voltages and nodal equations (B16) in the evidence.',
    ],
    symbols: [
      ['E_S', 'open-circuit voltage of the source, peak', 'V', ''],
      ['P_av', 'available power', 'W', 'up to 100 kW'],
    ],
    source: theory,
  },
  {
    number: 'B36',
    title: 'Mismatched load',
    lines: ['Z = frac(Z_L + Γ Z_L^*; 1 − Γ)  ,  |Γ| ≤ frac(s − 1; s + 1)'],
    text: [
      'Every load that reflects up to the stated VSWR s against its nominal impedance, at every angle. Voltages and currents are quotients of two expressions linear in Γ, without a pole for |Γ| < 1, so each is largest on the rim (maximum modulus); the largest there has a closed form.',
    ],
    symbols: [['s', 'voltage standing-wave ratio', '1', '1 to 1000']],
    source: theory,
  },
  {
    number: 'B37',
    title: 'Power at which a part reaches its rating',
    lines: ['P_lim = P_av · min((frac(d V_rated; V))^2, (frac(d I_rated; I_rms))^2, frac(d P_rated; P_part))'],
    text: [
      'With the mismatched figures where a mismatch is stated. Ratings are those of the stock line, otherwise those stated for all parts; one that is not known sets no limit and is said not to be known.',
    ],
    symbols: [['d', 'part of a rating that may be used', '1', '0.8 by default']],
    source: 'Derating: common practice, no source.',
  },
  {
    number: 'B38',
    title: 'Single-layer air coil',
    lines: ['L = frac(r^2 N^2; 9r + 10l) µH for r, l in inches', 'l = N (w + g)  ,  2r = D = D_form + w'],
    text: [
      'Solved for the number of turns. Good to about one per cent for l > 0.8 r; outside of that, and for less than one turn, a caution is printed with it.',
    ],
    symbols: [
      ['r, l', 'radius to the middle of the wire and length of the winding', 'inch', ''],
      ['w, g', 'wire diameter and gap between turns', 'm', '1 mm and 0.5 mm by default'],
      ['D_form', 'diameter of the form', 'm', '6 mm by default'],
    ],
    source: 'H. A. Wheeler, Proc. IRE 16, 1928; wire gauges by ASTM B258.',
  },
  {
    number: 'B39',
    title: 'Self-capacitance of a coil',
    lines: ['C_own = K(l/D) D  ,  f_SR = frac(1; 2π sqrt(L C_own))'],
    text: [
      'K in pF per centimetre of diameter from his table, 0.96 at l/D = 0.1, 0.46 at 1, 1.32 at 10, straight lines between; outside the table none is given. One end of the coil earthed.',
    ],
    symbols: [['K', 'self-capacitance per diameter', 'pF/cm', '']],
    source: 'R. G. Medhurst, Wireless Engineer 24, 1947 (table quoted from memory).',
  },
  {
    number: 'B40',
    title: 'Finished board',
    lines: ['d = sqrt(frac(1; n) (|Γ_1 − Γ_pred|^2 + … + |Γ_n − Γ_pred|^2))'],
    text: [
      'What was measured, looking in from the source’s side with the load attached, as a reflection coefficient for the aim (B1), against the prediction with real parts at the same frequencies, 201 at most. Each single cause is fitted by itself to the least d: the value or the Q of one part, a capacitance at one node, an inductance in one shunt arm, a shift of the load. Causes whose residuals lie within 10 % of the least are told as alike; where more than half of the distance is left, none explains the board. The verdict is over all samples in the band and its ends, interpolated, never beyond the data.',
    ],
    symbols: [
      ['d', 'distance between measurement and prediction', '1', '0 to 2'],
      ['n', 'number of frequencies', '1', ''],
    ],
    source: 'Least squares; the list of causes is one of this work.',
  },
];
