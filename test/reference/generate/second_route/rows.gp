\\ One line "z number <tab> column <tab> value" for every quantity that exists at each of the `asked` redshifts.
say(place, name, value) = if (value != nothing, printf("%s\t%s\t%.42e\n", place, name, value));
scaled(value, unit) = if (value == nothing, nothing, value*unit);

\\ In units of c/H0. The sign of `sine` is the side of the antipode.
sine(D) = my(r = sqrt(abs(OmegaK)*1.)); if (OmegaK > 0, sinh(r*D)/r, OmegaK < 0, sin(r*D)/r, D);
cosine(D) = my(r = sqrt(abs(OmegaK)*1.)); if (OmegaK > 0, cosh(r*D), OmegaK < 0, cos(r*D), 1);
volume(D) = if (D == 0, 0, integral(x -> [4*Pi*sine(x)^2], 0, D)[1]);
\\ A zero on paper, such as the drift in an empty universe, is a zero here.
less(x, y) = if (abs(x-y) < 1e-48*abs(x), 0, x-y);

distanceRow(i, z, E) =
{
  my(H = c/H0/Mpc, D = sinceThen(z, 2), M = H*abs(sine(D)), drift = less(1+z, E)*H0);
  say(i, "D_C_Mpc", H*D); say(i, "chi_Mpc", H*D);
  say(i, "D_M_Mpc", M); say(i, "D_A_Mpc", M/(1+z)); say(i, "D_L_Mpc", M*(1+z));
  say(i, "mu_mag", if (z == 0, nothing, 5*log(M*(1+z)*10^6/10)/log(10)));
  say(i, "kpc_per_arcsec", M/(1+z)*10^3 * Pi/(180*3600));
  say(i, "V_C_Gpc3", volume(D) * (H/1000)^3);
  say(i, "dV_dz_Mpc3_per_deg2", M^2*H/E * (Pi/180)^2);
  say(i, "D_V_Mpc", if (z == 0, 0, sqrtn(z*M^2*H/E, 3)));
  say(i, "t_L_Gyr", sinceThen(z, 1)/H0/Gyr);
  say(i, "dz_dt_per_Gyr", drift*Gyr);
  say(i, "dv_dt_cm_s_yr", 100*c*drift/(1+z) * Gyr/10^9);
  say(i, "v_rec_now_c", D); say(i, "v_rec_then_c", E/(1+z)*D);
}
otherRow(i, z, E) =
{
  my(a = 1/(1+z), H = H0*E, rho = 3*H^2/(8*Pi*GN), bright = [OmegaBC/a^3, allNeutrinos(a), OmegaGamma/a^4, darkEnergy(a)]);
  say(i, "a", a*1.); say(i, "E", E); say(i, "H_km_s_Mpc", H*Mpc/1000); say(i, "t_H_Gyr", 1/H/Gyr); say(i, "D_H_Mpc", c/H/Mpc);
  say(i, "t_Gyr", scaled(age(z), 1/H0/Gyr)); say(i, "eta_Gyr", scaled(conformal(z), 1/H0/Gyr));
  say(i, "T_CMB_K", if (T == 0, nothing, T*(1+z)*1.));
  say(i, "rho_c_kg_m3", rho); say(i, "rho_c_g_cm3", rho*10^3/10^6); say(i, "rho_c_Msun_Mpc3", rho/Msun*Mpc^3);
  for (k = 1, 4, say(i, ["Omega_bc", "Omega_nu", "Omega_gamma", "Omega_DE"][k], bright[k]/E^2));
  say(i, "Omega_k", OmegaK/a^2/E^2);
  say(i, "q", deceleration(a));
  say(i, "w_eff", if (bright == 0, nothing, pressure(a)/vecsum(bright)));
  say(i, "particle_horizon_Mpc", scaled(conformal(z), a*c/H0/Mpc));
  say(i, "event_horizon_Mpc", scaled(left(z), a*c/H0/Mpc));
}
row(i, z) = if (exists(z), my(E = sqrt(E2(1/(1+z)))); if (z >= 0, distanceRow(i, z, E)); otherRow(i, z, E));
