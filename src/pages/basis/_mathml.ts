/**
 * A formula written on one line as presentation MathML. The notation is that of an engineer's notes:
 * `Z_S`, `R_high`, `x^2`, `Z_S^*`, `frac(a; b)`, `sqrt(a)`, `|a|`, `(a)`; letters are variables, `j` the imaginary unit,
 * `Im`, `log10` and the like functions; anything else stands for itself.
 *
 * @throws SyntaxError when a bracket is left open
 */
export function mathml(text: string): string {
  const tokens =
    text.match(
      /frac\(|sqrt\(|[_^]\{[^}]*\}|[_^][A-Za-z0-9∗*]+|Im|Re\b|RL|min|max|log10|sinh|cosh|tanh|sin|for\b|[a-zA-ZΓωηπ]|\d+(?:\.\d+)?|\S/gu,
    ) ?? [];
  let next = 0;

  const row = (ends: string): string => {
    const parts: string[] = [];
    while (next < tokens.length && !ends.includes(tokens[next]!)) parts.push(scripted());
    return `<mrow>${parts.join('')}</mrow>`;
  };
  const close = (end: string): void => {
    if (tokens[next] !== end) throw new SyntaxError(`mathml: "${text}" lacks a "${end}"; close every bracket`);
    next += 1;
  };
  const scripted = (): string => {
    const base = atom();
    const index = script('_');
    const power = script('^');
    if (index !== '' && power !== '') return `<msubsup>${base}${index}${power}</msubsup>`;
    if (index !== '') return `<msub>${base}${index}</msub>`;
    return power === '' ? base : `<msup>${base}${power}</msup>`;
  };
  const script = (mark: string): string => {
    const token = tokens[next];
    if (token?.startsWith(mark) !== true || token.length < 2) return '';
    next += 1;
    const inner = token.slice(1).replace(/^\{|\}$/gu, '');
    if (/^\d+$/u.test(inner)) return `<mn>${inner}</mn>`;
    if (inner === '*') return '<mo>*</mo>';
    // An index that names a thing is upright; what stands in braces is a formula of its own.
    return token.startsWith(`${mark}{`) ? mathml.inner(inner) : upright(inner);
  };
  const atom = (): string => {
    const token = tokens[next]!;
    const before = tokens[next - 1];
    next += 1;
    if (token === 'frac(') {
      const over = row(';');
      close(';');
      const under = row(')');
      close(')');
      return `<mfrac>${over}${under}</mfrac>`;
    }
    if (token === 'sqrt(' || token === '(' || token === '|') {
      const end = token === '|' ? '|' : ')';
      const inner = row(end);
      close(end);
      if (token === 'sqrt(') return `<msqrt>${inner}</msqrt>`;
      return `<mrow><mo stretchy="false">${token}</mo>${inner}<mo stretchy="false">${end}</mo></mrow>`;
    }
    if (/^\d/u.test(token)) return `<mn>${token}</mn>`;
    if (token === 'log10') return `${thin}<msub>${upright('log')}<mn>10</mn></msub>${thin}`;
    if (token === 'for') return '<mtext>\u2002for\u2002</mtext>';
    if (/^(?:Im|Re|RL|min|max|sin|cos|tan)$/u.test(token) || /^(?:sin|cos|tan)/u.test(token))
      return upright(token) + thin;
    if (token === 'j' || token === 'Γ' || token === 'Ω') return upright(token);
    if (/^\p{L}/u.test(token)) return `<mi>${token}</mi>`;
    const unary = before === undefined || /^[=±,:;(|]$|^frac\($|^sqrt\($/u.test(before);
    return `<mo${unary ? ' form="prefix"' : ''}>${token.replace('<', '&lt;').replace('>', '&gt;')}</mo>`;
  };

  const whole = row(');');
  if (next < tokens.length)
    throw new SyntaxError(`mathml: "${text}" ends before "${tokens[next]!}"; check its brackets`);
  return `<math displaystyle="true">${whole}</math>`;
}

mathml.inner = (text: string): string => mathml(text).replace(/^<math[^>]*>|<\/math>$/gu, '');

const upright = (text: string): string => `<mi mathvariant="normal">${text}</mi>`;
const thin = '<mspace width="0.17em"/>';
