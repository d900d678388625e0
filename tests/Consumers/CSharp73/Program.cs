using System;
using TwoPhase.Slip;

namespace Consumers.CSharp73
{
    internal static class Program
    {
        private static void Main()
        {
            foreach (var model in VoidFractionModel.All)
            {
                Console.WriteLine(model.Name);
            }
        }
    }
}
