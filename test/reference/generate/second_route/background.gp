\\ The Friedmann background of design.md section 4. Before this file is read, `given` is a map of the parameters as exact
\\ fractions (keys as in models.json) and `masses` a vector in eV. Densities are in units of today's critical density.
read("fermiDirac.gp");
c = 299792458;
Mpc = 10^6 * 648000/Pi * 149597870700;
Gyr = 10^9 * 36525/100 * 86400;
kB = 1380649/10^29;
hPlanck = 662607015/10^42;
eV = 1602176634/10^28;
GN = 667430/10^16;
Msun = 13271244*10^13 / GN;

wanted(key) = if (mapisdefined(given, key), mapget(given, key), 0);
H0 = wanted("H0") * 1000 / Mpc;
rhoCritical = 3*H0^2 / (8*Pi*GN);
w0 = wanted("w0"); wa = wanted("wa");
T = wanted("T_CMB"); Neff = wanted("N_eff");
OmegaGamma = 8*Pi^5*(kB*T)^4 / (15*(hPlanck*c)^3) / (rhoCritical*c^2);
if (#masses == 0, masses = [0]);
perState = if (T == 0 || Neff == 0, 0, 7/8 * (4/11.)^(4/3) * Neff/#masses * OmegaGamma);
perElectronvolt = if (perState == 0, 0, eV / (kB * T * (4/11.)^(1/3) * (1.*Neff/#masses)^(1/4)));
\\ [number of eigenstates, y today] of each different mass
states = [[#select(x -> x == m, masses), m * perElectronvolt] | m <- Set(masses), perState != 0];
allNeutrinos(a) = sum(i = 1, #states, states[i][1] * if (states[i][2] == 0, 1, energyRatio(states[i][2]*a))) * perState/a^4;
slowNeutrinos(a) = sum(i = 1, #states, if (states[i][2] == 0, 0, states[i][1] * energyRatio(states[i][2]*a))) * perState/a^4;
neutrinoPressure(a) = sum(i = 1, #states, states[i][1] * if (states[i][2] == 0, 1, pressureRatio(states[i][2]*a))) * perState/a^4/3;

OmegaBC = if (mapisdefined(given, "Omega_m"), wanted("Omega_m") - slowNeutrinos(1), (wanted("omega_b") + wanted("omega_c")) / (wanted("H0")/100)^2);
withoutCurvature = 1 - OmegaBC - OmegaGamma - allNeutrinos(1);
OmegaDE = if (mapisdefined(given, "Omega_DE"), wanted("Omega_DE"), withoutCurvature - wanted("Omega_k"));
OmegaK = if (mapisdefined(given, "Omega_DE"), withoutCurvature - OmegaDE, wanted("Omega_k"));

darkEnergy(a) = if (OmegaDE == 0, 0, OmegaDE * (1.*a)^(-3*(1+w0+wa)) * exp(-3*wa*(1-a)));
matter(a) = OmegaBC/a^3 + slowNeutrinos(a);
E2(a) = OmegaBC/a^3 + OmegaGamma/a^4 + allNeutrinos(a) + OmegaK/a^2 + darkEnergy(a);
pressure(a) = OmegaGamma/a^4/3 + neutrinoPressure(a) + (w0 + wa*(1-a)) * darkEnergy(a);
deceleration(a) = my(e2 = E2(a)); (e2 - OmegaK/a^2 + 3*pressure(a)) / (2*e2);
