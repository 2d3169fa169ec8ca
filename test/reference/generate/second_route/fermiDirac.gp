\\ Second route to the Fermi-Dirac integrals: F(y) = int x^2 sqrt(x^2+y^2)/(e^x+1), G(y) = int x^4/sqrt(x^2+y^2)/(e^x+1).
\\ Gauss-Legendre in x itself over panels [2^j, 2^(j+1)]: x = 0, where the root turns singular as y -> 0, is at three
\\ half-widths from the middle of every panel, so 36 points give 36 log10(3+sqrt(8))*2 = 55 digits. Below 2^-55 the
\\ integral is less than 1e-49 of the whole; above 128, less than 1e-48.
default(realprecision, 57);
{
  FD_pairs = List();
  my(rule = intnumgaussinit(36));
  for (j = -55, 6,
    my(half = 2.^(j-1), middle = 3*half, pieces = if (j < 2, 1, 2^(j-1)));
    for (p = 1, pieces,
      my(h = half/pieces, m = 2*half + (2*p-1)*h);
      for (k = 1, #rule[1],
        foreach ([m - h*rule[1][k], m + h*rule[1][k]], x, listput(FD_pairs, [x^2, x^2*h*rule[2][k]/(exp(x)+1)])))));
}
FD_squares = vector(#FD_pairs, i, FD_pairs[i][1]);
FD_weights = vector(#FD_pairs, i, FD_pairs[i][2])~;
FD_weights4 = vector(#FD_pairs, i, FD_pairs[i][1]*FD_pairs[i][2])~;
FD_ones = vector(#FD_pairs, i, 1);
energyIntegral(y) = sqrt(FD_squares + y^2*FD_ones) * FD_weights;
pressureIntegral(y) = vector(#FD_squares, i, 1/sqrt(FD_squares[i] + y^2)) * FD_weights4;
FD_zero = energyIntegral(0);
energyRatio(y) = energyIntegral(y) / FD_zero;
pressureRatio(y) = pressureIntegral(y) / FD_zero;
