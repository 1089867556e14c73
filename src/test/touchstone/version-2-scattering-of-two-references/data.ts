[Version] 2.0
# GHz S RI R 50
[Number of Ports] 2
[Two-Port Data Order] 12_21
[Number of Frequencies] 1
[Reference]
75    ! the first
50
[Network Data]
! a 75 ohm to 50 ohm minimum-loss pad, matched at both ends: 5.7195 dB
1 0 0  0.517638090205041525 0  0.517638090205041525 0  0 0
[End]
