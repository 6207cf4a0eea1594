using ClubBench.Club.Tests.Support;
using ClubBench.Club.UseCases.Clubs;
using ClubBench.Club.UseCases.Readings;
using ClubBench.Club.UseCases.Room;
using ClubBench.Planning.Advising;
using ClubBench.Planning.Figures;
using Record = ClubBench.Club.UseCases.Readings.Record;

namespace ClubBench.Club.Tests.UseCases;

public sealed class BatchAlertTests
{
    [Theory]
    [InlineData(new[] { 1.06, 1.07, 1.08, 1.06 }, BatchSide.High)]
    [InlineData(new[] { 0.94, 0.93, 0.92, 0.94 }, BatchSide.Low)]
    [InlineData(new[] { 1.06, 1.07, 1.08 }, BatchSide.None)]
    [InlineData(new[] { 1.06, 1.07, 1.08, 1.04 }, BatchSide.None)]
    [InlineData(new[] { 1.06, 0.93, 1.08, 1.06 }, BatchSide.None)]
    [InlineData(new[] { 1.00, 1.01, 0.99, 1.30 }, BatchSide.None)]
    public void Of_WindowOfTenPercent_AlertsOnlyWhenEveryBoardIsOffToOneSide(double[] values, BatchSide expected) =>
        Assert.Equal(expected, BatchAlert.Of(1, 0.9, 1.1, WindowSides.Both, values));

    [Fact]
    public void Of_OneSidedWindow_IgnoresTheSideThatDoesNotCount()
    {
        Assert.Equal(BatchSide.None, BatchAlert.Of(1, 0.9, 1.1, WindowSides.AtLeast, [1.2, 1.2, 1.2, 1.2]));
        Assert.Equal(BatchSide.Low, BatchAlert.Of(1, 0.9, 1.1, WindowSides.AtLeast, [0.8, 0.8, 0.8, 0.8]));
    }

    [Fact]
    public async Task Record_EveryBoardTooHigh_WithholdsRewindingAndAlertsTheRoom()
    {
        await using var club = await TestClub.FilledAsync();
        var coil = await club.CoilAsync();

        var last = await ReadAsync(club, coil, Far(coil), Far(coil), Far(coil), Far(coil));

        Assert.Equal("advice.batch-off", Assert.Single(last.Ladder).Code);
        var room = (await club.Run(club.Get<OpenRoom>(), club.Ids.Mentor, new OpenRoomInput(club.Ids.NightId))).Value;
        Assert.Equal((coil.Point, 4, BatchSide.High), room.Alerts.Select(a => (a.Point, a.Boards, a.Side)).Single());
    }

    [Fact]
    public async Task Record_OneOutlierAmongGoodBoards_AdvisesThatBoardAndStaysSilent()
    {
        await using var club = await TestClub.FilledAsync();
        var coil = await club.CoilAsync();

        var last = await ReadAsync(club, coil, 1, 1, 1, Far(coil));

        Assert.DoesNotContain(last.Ladder, s => s.Code == "advice.batch-off");
        Assert.NotEqual(ReadingVerdict.Good, last.Verdict);
        Assert.Empty((await club.Run(club.Get<OpenRoom>(), club.Ids.Mentor, new OpenRoomInput(club.Ids.NightId))).Value.Alerts);
    }

    [Fact]
    public async Task OpenRoom_OffsetOfTheMeterEntered_EndsTheAlert()
    {
        await using var club = await TestClub.FilledAsync();
        var coil = await club.CoilAsync();
        await ReadAsync(club, coil, Far(coil), Far(coil), Far(coil), Far(coil));
        var meter = (await club.Run(club.Get<OpenClub>(), club.Ids.Coordinator, new OpenClubInput())).Value.Instruments.Single();

        await club.Run(club.Get<ChangeInstrument>(), club.Ids.Coordinator, new ChangeInstrumentInput(meter.Id, meter.Version, 0.02, 0, coil.Nominal * (Far(coil) - 1), QuantityKind.Inductance, ""));

        Assert.Empty((await club.Run(club.Get<OpenRoom>(), club.Ids.Mentor, new OpenRoomInput(club.Ids.NightId))).Value.Alerts);
    }

    /// <summary>A ratio beyond the upper end of the window.</summary>
    private static double Far(ExpectedReading coil) => 1 + (1.3 * ((coil.HighSi / coil.Nominal) - 1));

    private static async Task<Advice> ReadAsync(TestClub club, ExpectedReading coil, params double[] ratios)
    {
        Advice last = null!;
        for (var i = 0; i < ratios.Length; i++) last = (await club.Run(club.Get<Record>(), club.Ids.Builders[i], ReadingTests.Of(club, i, coil, ratios[i]))).Value.Advice;
        return last;
    }
}
