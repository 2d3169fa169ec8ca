\\ Age and conformal time in units of 1/H0, integrated in the scale factor itself: dt = da/(a E), dD = da/(a^2 E).
\\ `asked` is the vector of redshifts.
rates(a) = my(E = sqrt(E2(a))); [1/(a*E), 1/(a^2*E)];

\\ E^2 ~ a^-earlyPower at first. The event horizon needs E^2 to fall more slowly than a^-2 at last.
earlyPower = vecmax([if (OmegaBC, 3), if (OmegaGamma, 4), if (OmegaK, 2), if (OmegaDE, 3*(1+w0+wa))]);
hasAge = earlyPower > 0;
hasParticleHorizon = earlyPower > 2;
{
  turn = 0; \\ the scale factor at which the expansion stops, 0 if it never does
  my(a = 1., next);
  while (a < 10^6 && !turn,
    next = a * 101/100;
    if (E2(next) <= 0, turn = solve(x = a, next, E2(x)));
    a = next);
}
hasEventHorizon = turn || (OmegaDE && (wa > 0 || (wa == 0 && 3*(1+w0) < 2)));
exists(z) = !turn || 1/(1+z) < turn;

\\ To the turning point, with a = turn (1 - s^2).
toTurn(a) = integral(s -> 2*turn*s * rates(turn*(1-s^2)), 0, sqrt(1 - a/turn));

\\ `knots` in order of time; steps[i] = [age, conformal time] from knot i to knot i+1.
layOut(redshifts) =
{
  knots = vecsort(Set(concat([0], select(exists, redshifts))), , 4);
  today = vecsearch(-knots, 0);
  steps = vector(#knots-1, i, integral(rates, 1/(1+knots[i]), 1/(1+knots[i+1])));
  my(a1 = 1/(1+knots[1]), x2 = 1 + knots[#knots]);
  firstAge = if (hasAge, integralFromZero(a -> [rates(a)[1]], a1)[1]);
  firstConformal = if (hasParticleHorizon, integralFromZero(a -> [rates(a)[2]], a1)[1]);
  last = if (turn, toTurn(1/x2), hasEventHorizon, [0, integralFromZero(x -> [1/sqrt(E2(1/x))], x2)[1]]);
}
place(z) = for (i = 1, #knots, if (knots[i] == z, return(i))); error("no knot at ", z);
nothing = "none";
age(z) = if (hasAge, firstAge + sum(i = 1, place(z)-1, steps[i][1]), nothing);
conformal(z) = if (hasParticleHorizon, firstConformal + sum(i = 1, place(z)-1, steps[i][2]), nothing);
sinceThen(z, kind) = my(total = 0); forstep (i = today-1, place(z), -1, total += steps[i][kind]); total;
toLast(z, kind) = my(total = last[kind]); forstep (i = #steps, place(z), -1, total += steps[i][kind]); total;

\\ Comoving distance left: to infinity, or to the turning point and on to the crunch.
left(z) = if (turn, toLast(z, 2) + toLast(knots[1], 2) + firstConformal, hasEventHorizon, toLast(z, 2), nothing);
