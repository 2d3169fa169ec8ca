\\ Nodes and weights of the Gauss-Legendre rule with `points` points, in turn, one a line.
\\ Roots of the exact polynomial; each weight is the integral of its Lagrange polynomial from -1 to 1.
default(realprecision, 77);
P = pollegendre(points);
nodes = vecsort(real(polroots(P)));
{
  for (k = 1, points,
    lagrange = prod(j = 1, points, if (j == k, 1, ('x - nodes[j]) / (nodes[k] - nodes[j])));
    area = intformal(lagrange);
    printf("%.45e\n%.45e\n", nodes[k], subst(area, 'x, 1) - subst(area, 'x, -1))
  )
}
