\\ Adaptive 30-point Gauss-Legendre quadrature of vector-valued functions.
{
  my(rule = intnumgaussinit(30));
  gaussNodes = concat(-rule[1], rule[1]);
  gaussWeights = concat(rule[2], rule[2]);
}
gauss(f, low, high) = my(m = (low+high)/2, h = (high-low)/2.); h * sum(k = 1, #gaussNodes, gaussWeights[k] * f(m + h*gaussNodes[k]));

\\ Halves the interval until the halves change the whole by less than 1e-40 of itself; the halves are then far better.
integral(f, low, high, whole = gauss(f, low, high)) =
{
  my(m = (low+high)/2, left = gauss(f, low, m), right = gauss(f, m, high), both = left + right);
  if (vecmin(vector(#both, i, abs(both[i] - whole[i]) <= 1e-40 * abs(both[i]))), return(both));
  if (high - low < 1e-30*abs(high), error("no convergence near ", low));
  integral(f, low, m, left) + integral(f, m, high, right);
}

\\ From 0 to high, f a power of x near 0: with x = high s^4, over [1/2,1], [1/4,1/2], ... of s until nothing is added.
integralFromZero(f, high) =
{
  my(g = s -> 4*high*s^3 * f(high*s^4), total = 0, piece, top = 1.);
  while (1,
    piece = integral(g, top/2, top);
    total += piece;
    if (vecmin(vector(#piece, i, abs(piece[i]) < 1e-47 * abs(total[i]))), return(total));
    top /= 2);
}
