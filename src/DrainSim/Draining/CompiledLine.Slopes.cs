namespace DrainSim.Draining;

/// <content>How the flow answers to what it depends on.</content>
internal sealed partial class CompiledLine
{
    /// <summary>Change of level by which the slope of a flow held at the threshold is measured, m: the flow is smooth over it.</summary>
    private const double SlopeProbe = 1e-6;

    /// <summary>The slopes of <see cref="Flow(in LineConditions)"/>.</summary>
    /// <param name="state">as there</param>
    /// <param name="flow">the flow at that state, m³/s</param>
    public LineSlopes Slopes(in LineConditions state, double flow)
    {
        double head = Head(state.Surface, state.Gas, state.Delivered);
        bool isSubmerged = IsSubmerged(state.Delivered);
        if (head == 0 || (head < 0 && !isSubmerged))
            return default;
        double free = Hydraulics.Flow(Math.Abs(head), Math.Abs(flow), out double byHead);
        double byCover = 0, byReceiver = byHead;
        if (head > 0 && state.IsLimited)
        {
            double most = free + byHead * SlopeProbe;
            double further = Hydraulics.FlowKeepingLowPoint(Threshold, state.Surface + SlopeProbe, state.Gas, most);
            byHead = (further - flow) / SlopeProbe;
            byReceiver = flow < free ? 0 : byHead;
        }
        else if (head > 0 && tail is not null)
        {
            double cover = state.Surface - Hydraulics.InletElevation;
            tail.Flow(cover, gravity, free / parallel, byHead / parallel, out double both);
            tail.Flow(cover, gravity, free / parallel, 0, out byCover);
            byCover *= parallel;
            byReceiver = byHead = parallel * both - byCover;
        }

        double receiverRise = isSubmerged && receiver is not null ? 1 / receiver.Area(ReceiverDepth(state.Delivered)!.Value) : 0;
        return new LineSlopes(byHead + byCover, byHead / SpecificWeight, -byReceiver * receiverRise);
    }
}
