using DrainSim.Scenarios;

namespace DrainSim.Tests.Scenarios;

public sealed class NearestTests
{
    [Theory]
    [InlineData("fiting", "fitting")]
    [InlineData("lenght", "length")]
    [InlineData("Diameter", "diameter")]
    [InlineData("bottom_dia", null)]
    [InlineData("x", null)]
    [InlineData("", null)]
    public void The_word_meant_is_the_nearest_one(string text, string? meant) =>
        Assert.Equal(meant, Nearest.Find(text, ["length", "fitting", "diameter", "to"]));
}
