\\ The whole second route for one model: `given`, `masses` and `asked` are set before; see rows.gp for the output.
read("background.gp");
read("quadrature.gp");
read("timeline.gp");
read("rows.gp");
read("milestones.gp");
layOut(concat(asked, select(z -> z != nothing, [zEquality, zAcceleration, zMatterDE])));
for (i = 1, #asked, row(i-1, asked[i]));
milestones();
