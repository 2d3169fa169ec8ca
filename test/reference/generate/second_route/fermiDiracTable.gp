\\ R(y) and P(y) in turn for each of `arguments`, one a line.
read("fermiDirac.gp");
foreach(arguments, y, printf("%.45e\n%.45e\n", energyRatio(y), pressureRatio(y)));
