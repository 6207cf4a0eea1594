using ClubBench.Calculation.Devices;
using ClubBench.Calculation.Noise;
using ClubBench.Calculation.Quantities;
using ClubBench.Planning.Budgets;
using ClubBench.Planning.Kits;
using ClubBench.Planning.Plans;

namespace ClubBench.Planning.Tests.KitAcceptance;

/// <summary>Common practice of the trade.</summary>
public class CommonPractice
{
    [Theory]
    [InlineData("80 m")]
    [InlineData("40 m")]
    [InlineData("20 m")]
    [InlineData("15 m")]
    public void Plan_AnyHfBand_KeepsUntunedBufferAndAudio(string band)
    {
        var plan = KitA.Plan(band);

        Assert.All(new[] { "A2", "A8", "A9", "A10", "A11", "A12" }, s => Assert.True(plan.Stage(s).Action <= StageAction.Check, $"{s} {plan.Stage(s).Action}"));
        Assert.All(new[] { "A2", "A9", "A10" }, s => Assert.Empty(plan.Stage(s).Changes));
    }

    [Fact]
    public void OutputFilter_CutJustAboveItsBand_GivesVeryLowPowerAnOctaveUp()
    {
        var octaveUp = FrequencyRange.At(Frequency.FromMegahertz(20.24));
        var chain = new Chain(KitA.Kit, ChainConditions.OwnBand(KitA.Kit, LearntValues.None) with { Band = octaveUp, Reference = octaveUp.Low });

        var share = 1 / Decibels.FromDb(KitA.LossDb(chain, "A5", 20.24)).PowerRatio;

        Assert.True(share < 0.001);
    }

    [Fact]
    public void OutputFilter_CutJustAboveItsBand_PassesHarmonicsAnOctaveDown()
    {
        var chain = KitA.OwnBand();

        Assert.True(KitA.LossDb(chain, "A5", 2 * 5.06) < 0.5);
    }

    [Fact]
    public void BaseReturn_LargerResistor_RaisesGainMonotonically()
    {
        var gains = new double[] { 22, 27, 33, 47, 68 }.Select(ohm => GainWith(ohm)).ToList();

        Assert.Equal(gains.Order(), gains);
        Assert.Equal(gains.Count, gains.Distinct().Count());
    }

    [Fact]
    public void FinalOn20m_Says_WhatEachBaseReturnBuysAndWhatStaysMissing()
    {
        var finding = KitA.Plan("20 m").Stage("A4").WhyChanged.Single(f => f.Code == "final.gain-falls");
        double Si(string name) => finding.Figures.Single(f => f.Name == name).Si;

        Assert.Equal(Si("lost"), Si("bought-47") + Si("left-47"), 1e-9);
        Assert.Equal(Si("lost"), Si("bought-68") + Si("left-68"), 1e-9);
        Assert.True(Si("bought-68") > Si("bought-47"));
        Assert.True(Si("left-68") > 0);
    }

    [Fact]
    public void FinalOn40m_Says_WhatSmallerBaseReturnsTakeBack()
    {
        var finding = KitA.Plan("40 m").Stage("A4").WhyChanged.Single(f => f.Code == "final.gain-rises");

        Assert.Contains(finding.Figures, f => f.Name == "bought-27");
        Assert.Contains(finding.Figures, f => f.Name == "bought-22");
    }

    [Fact]
    public void Device_TransitionFrequencyOf100MHz_IsFineAt7AndLacksGainAt14()
    {
        var ft = Frequency.FromMegahertz(100);

        Assert.Equal(FrequencySuitability.Comfortable, CurrentGain.Suitability(ft, Frequency.FromMegahertz(7.03)));
        Assert.Equal(FrequencySuitability.LessGain, CurrentGain.Suitability(ft, Frequency.FromMegahertz(14.06)));
    }

    [Fact]
    public void Preamplifier_RuralSite29Decibels_NotNeededAt7AndMarginalAt14()
    {
        var chain = Decibels.FromDb(29);

        Assert.Equal(PreamplifierVerdict.NotNeeded, PreamplifierNeed.Judge(chain, NoiseSite.Rural, Frequency.FromMegahertz(7.03)).Verdict);
        Assert.Equal(PreamplifierVerdict.Marginal, PreamplifierNeed.Judge(chain, NoiseSite.Rural, Frequency.FromMegahertz(14.06)).Verdict);
    }

    [Fact]
    public void Judgement_SmallMoveDown_IsEasierThanALargeMoveUp()
    {
        var (down, up) = (KitA.Plan("40 m").Judgement, KitA.Plan("10 m").Judgement);

        Assert.True(down.Effort < up.Effort);
        Assert.True(down.Verdict < up.Verdict);
        Assert.Contains(down.Reasons, r => r.Code == "judgement.small-move-down");
        Assert.Contains(up.Reasons, r => r.Code == "judgement.large-move-up");
    }

    private static double GainWith(double ohm)
    {
        var a4 = KitA.Kit.Stage("A4");
        var stage = KitA.With(a4, ("R16", r => r.With((PartValue.Resistance, ohm)))).WithSetting("designBaseReturnOhm", 33);
        return KitA.Figure(KitA.Kept("20 m", KitA.Kit.With(stage)), "A4", "gain");
    }
}
