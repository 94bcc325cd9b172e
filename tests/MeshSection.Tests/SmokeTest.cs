namespace MeshSection.Tests;
public class SmokeTest
{
    [Fact]
    public void A_circle_has_its_length() => Assert.Equal(Math.Tau, MeshSection.Geometry.Boundary.Circle(default, 1).Length, 12);
}
