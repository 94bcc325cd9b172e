using MeshSection.Plots.Drawing;
using MeshSection.Plots.Tests.Samples;
using OxyPlot;

namespace MeshSection.Plots.Tests;

public class ThinWallTests
{
    [Fact]
    public void The_line_around_thin_walls_is_thinner_than_they_are()
    {
        // A wall of one in a hundred comes out some seven units thick.
        var thin = Rim(Sample.Tube("Tube", 99, 100, 60, 1));
        var thick = Rim(Sample.Tube("Tube", 60, 100, 60, 1));
        Assert.InRange(thin, 1.2, 1.5);
        Assert.Equal(3.2, thick);

        static double Rim(Sample sample) => sample.Figure().Marks.OfType<Area>().Single(a => a.Fill == OxyColors.Undefined && a.Loops.Length == 2).Rim.Thickness;
    }
}
