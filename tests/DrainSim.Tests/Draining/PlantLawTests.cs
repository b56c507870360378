using CsCheck;
using DrainSim.Draining;
using DrainSim.Gas;

namespace DrainSim.Tests.Draining;

/// <summary>Laws of what couples to the line: receivers, vents, lines side by side.</summary>
public sealed class PlantLawTests
{
    private const int Cases = 60;

    private static readonly Gen<Job> AnyDrain = Gen.Select(
        Gen.Double[0.5, 5], Gen.Double[0.5, 3.5], Gen.Double[0.02, 0.08], Gen.Double[-8, 0], (area, level, bore, log) =>
            Jobs.OrificeDrain(area, 4, level, bore) with
            {
                Liquid = Jobs.Water with { Viscosity = Math.Pow(10, log) },
                Run = new RunSettings { StopAtLevel = level / 2, Until = 1e9 },
            });

    [Fact]
    public void A_receiver_never_helps() =>
        Gen.Select(AnyDrain, Gen.Double[0.2, 5], Gen.Double[-1.5, 0.1], Gen.Double[0, 0.3]).Sample((job, area, bottom, level) =>
        {
            var receiver = new ReceivingTank { Vessel = Jobs.Prism(area, 20), Bottom = bottom, Level = level };
            double open = Run(job).StoppedAt;
            DrainResult result = Run(job with { DrawOffs = [job.DrawOffs[0] with { Receiver = receiver }] });
            Assert.True(result.Outcome != Outcome.TargetReached || result.StoppedAt >= open * (1 - 1e-7), $"{result.StoppedAt} {open}");
        }, iter: Cases);

    [Fact]
    public void A_wider_vent_never_drains_slower() =>
        Gen.Select(AnyDrain, Gen.Double[-6, -2], Gen.Double[1.05, 3]).Sample((job, logBore, wider) =>
        {
            double narrow = Run(Vented(job, Math.Exp(logBore))).StoppedAt, wide = Run(Vented(job, wider * Math.Exp(logBore))).StoppedAt;
            Assert.True(wide <= narrow * (1 + 1e-6), $"{wide} {narrow}");
        }, iter: Cases);

    [Fact]
    public void No_vent_is_better_than_the_open_air() => Gen.Select(AnyDrain, Gen.Double[-6, -2]).Sample((job, logBore) =>
        Assert.True(Run(Vented(job, Math.Exp(logBore))).StoppedAt >= Run(job).StoppedAt * (1 - 1e-7)), iter: Cases);

    [Fact]
    public void A_sealed_tank_keeps_its_gas() => AnyDrain.Sample(job =>
    {
        DrainResult result = Run(job with { Headspace = new ClosedHeadspace() });
        double vapour = job.Liquid.VapourPressure, before = job.Vessel.Capacity - result.InitialVolume;
        double after = job.Vessel.Capacity - result.LeftVolume;
        Assert.Equal((101325 - vapour) * before, (result.HeadspacePressure!.Value - vapour) * after, 1e-9 * 101325 * before);
    }, iter: Cases);

    [Fact]
    public void Liquid_is_neither_made_nor_lost_between_two_tanks() =>
        Gen.Select(AnyDrain, Gen.Double[0.2, 5], Gen.Double[0.01, 4]).Sample((job, area, level) =>
        {
            var receiver = new ReceivingTank { Vessel = Jobs.Prism(area, 20), Bottom = 0, Level = level };
            DrainResult result = Run(job with { DrawOffs = [job.DrawOffs[0] with { Receiver = receiver }] });
            double before = result.InitialVolume + area * level;
            Assert.Equal(before, result.LeftVolume + area * result.ReceiverLevel!.Value, 1e-9 * before);
        }, iter: Cases);

    [Fact]
    public void Parallel_lines_carry_their_number_of_times_one() => Gen.Select(AnyDrain, Gen.Int[2, 6]).Sample((job, count) =>
    {
        Job several = job with { DrawOffs = Jobs.Only(job.Line with { Parallel = count }) };
        double time = Run(job).StoppedAt;
        Assert.Equal(time / count, Run(several).StoppedAt, 1e-9 * time);
    }, iter: Cases);

    private static DrainResult Run(Job job) => Simulation.Run(job, CancellationToken.None);

    private static Job Vented(Job job, double bore) =>
        job with { Headspace = new VentedHeadspace { Openings = [new VentOrifice { Bore = bore }] } };
}
