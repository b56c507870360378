namespace DrainSim.Tests;

public sealed class NumberTextTests
{
    [Theory]
    [InlineData("1.5", 1.5)]
    [InlineData(" -2e-3 ", -0.002)]
    [InlineData(".5", 0.5)]
    public void A_plain_number_is_read(string text, double value)
    {
        Assert.True(NumberText.TryRead(text, out double read));
        Assert.Equal(value, read);
    }

    [Theory]
    [InlineData("1,5")]
    [InlineData("1 000")]
    [InlineData("NaN")]
    [InlineData("1e999")]
    [InlineData("")]
    [InlineData("0x10")]
    public void Anything_else_is_refused(string text) => Assert.False(NumberText.TryRead(text, out _));
}
