\\ The single epochs, scanned in steps of 1 % in the scale factor and refined by Brent's method.
firstRoot(f, fallingOnly) =
{
  my(a = exp(-14.), before = f(a), b, after);
  while (a < exp(14),
    b = a*101/100;
    if (turn && b >= turn, return(nothing));
    after = f(b);
    if (before*after < 0 && (after < 0 || !fallingOnly), return(1/solve(x = a, b, f(x)) - 1));
    a = b; before = after);
  nothing;
}
zEquality = if (OmegaGamma && OmegaBC, OmegaBC / (OmegaGamma * (1 + 7/8*(4/11.)^(4/3)*Neff)) - 1, nothing);
zAcceleration = firstRoot(deceleration, 1);
zMatterDE = if (OmegaDE > 0, firstRoot(a -> matter(a) - darkEnergy(a), 0), nothing);

\\ [z, D] in steps of 1 % in 1+z, D by Simpson's rule: the start of the two searches in distance.
coarse() =
{
  my(list = List([[0, 0.]]), z = 0, D = 0, f = x -> 1/sqrt(E2(1/(1+x))), next);
  while (z < 10^6,
    next = z + (1+z)/100.;
    D += (next-z)/6 * (f(z) + 4*f((z+next)/2) + f(next));
    listput(list, [next, D]); z = next);
  Vec(list);
}
exactly(z) = my(k = 1); while (knots[k] > z, k++); sinceThen(knots[k], 2) + if (knots[k] == z, 0, integral(rates, 1/(1+z), 1/(1+knots[k]))[2]);

\\ Root between two redshifts of g(z, D(z)).
rootInDistance(g, low, high) = my(D0 = exactly(low)); solve(z = low, high, g(z, D0 + integral(x -> [1/sqrt(E2(1/(1+x)))], low, z)[1]));

recession(list) = for (k = 2, #list, if (list[k][2] >= 1, return(rootInDistance((z, D) -> D - 1, list[max(k-2, 1)][1], list[min(k+1, #list)][1])))); nothing;

largestDA(list) =
{
  my(DA = [abs(sine(p[2])) / (1+p[1]) | p <- list], top = vecmax(DA), k = 1, z);
  while (DA[k] < top, k++);
  if (k == #list || vecmax(DA[k..#list]) <= DA[#list], return([nothing, nothing]));
  z = rootInDistance((z, D) -> (1+z)*cosine(D)/sqrt(E2(1/(1+z))) - sine(D), list[k-1][1], list[k+1][1]);
  [z, abs(sine(exactly(z)))/(1+z)];
}
milestones() =
{
  my(H = c/H0/Mpc, time = 1/H0/Gyr, list = coarse(), peak = largestDA(list), at = z -> if (z == nothing, nothing, !exists(z), nothing, scaled(age(z), time)));
  my(put = (name, value) -> say("milestone", name, value));
  put("hubble_time", time); put("hubble_distance", H);
  put("critical_density_SI", rhoCritical); put("critical_density_cgs", rhoCritical/1000);
  put("critical_density_Msun", rhoCritical/Msun*Mpc^3);
  put("age_today", at(0));
  put("z_equality", zEquality); put("t_equality", at(zEquality));
  put("z_acceleration", zAcceleration); put("t_acceleration", at(zAcceleration));
  put("z_matter_DE_equality", zMatterDE); put("t_matter_DE_equality", at(zMatterDE));
  put("z_largest_D_A", peak[1]); put("largest_D_A", scaled(peak[2], H));
  put("z_recession_c", recession(list));
  put("particle_horizon_today", scaled(conformal(0), H)); put("event_horizon_today", scaled(left(0), H));
  printf("milestone\tfate\t%s\n", if (turn, "recollapses", darkEnergy(10^6) > max(0, darkEnergy(10^5)), "big rip", "expands forever"));
  put("t_maximum", if (turn, (age(0) + toLast(0, 1))*time, nothing));
  put("t_crunch", if (turn, 2*(age(0) + toLast(0, 1))*time, nothing));
}
